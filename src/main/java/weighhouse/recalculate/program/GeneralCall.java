package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Function;
import weighhouse.recalculate.functions.Signature;

/**
 * A call of a function on evaluated arguments. An array where the function takes one value makes it
 * run once for each element.
 */
final class GeneralCall extends Node {
  private final Function.Body body;
  private final Signature signature;
  private final Node[] arguments;

  GeneralCall(Function.Body body, Signature signature, Node[] arguments) {
    this.body = body;
    this.signature = signature;
    this.arguments = arguments;
  }

  @Override
  public Value value(Frame frame) {
    Value[] values = new Value[arguments.length];
    int rows = 1;
    int columns = 1;
    for (int i = 0; i < values.length; i++) {
      if (signature.kind(i) == 'V') {
        values[i] = arguments[i].value(frame);
        rows = Math.max(rows, Broadcast.rows(values[i]));
        columns = Math.max(columns, Broadcast.columns(values[i]));
      }
    }
    if (rows == 1 && columns == 1) {
      return single(frame, values, 0, 0);
    }
    Value[][] results = new Value[rows][columns];
    for (int r = 0; r < rows; r++) {
      for (int c = 0; c < columns; c++) {
        results[r][c] = weighhouse.recalculate.functions.Coerce.single(single(frame, values, r, c));
      }
    }
    return new Value.Array(results);
  }

  private Value single(Frame frame, Value[] values, int row, int column) {
    Value[] elements = new Value[values.length];
    for (int i = 0; i < elements.length; i++) {
      elements[i] = values[i] == null ? null : Broadcast.element(values[i], row, column);
    }
    try {
      return body.call(new CallArguments(frame, arguments, elements));
    } catch (FaultException e) {
      return e.value();
    }
  }
}
