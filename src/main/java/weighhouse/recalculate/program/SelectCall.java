package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Function;
import weighhouse.recalculate.functions.Reference;
import weighhouse.recalculate.functions.Signature;

/** CHOOSE, IFERROR and the like: the function names the argument that is its result. */
final class SelectCall extends Node {
  private final Function.Selector selector;
  private final Signature signature;
  private final Node[] arguments;

  SelectCall(Function.Selector selector, Signature signature, Node[] arguments) {
    this.selector = selector;
    this.signature = signature;
    this.arguments = arguments;
  }

  @Override
  public Value value(Frame frame) {
    Value[] values = new Value[arguments.length];
    int rows = 1;
    int columns = 1;
    for (int i = 0; i < arguments.length && decides(i); i++) {
      values[i] = arguments[i].value(frame);
      rows = Math.max(rows, Broadcast.rows(values[i]));
      columns = Math.max(columns, Broadcast.columns(values[i]));
    }
    return rows * columns == 1 ? one(frame, values) : each(frame, values, rows, columns);
  }

  /** The first argument decides, or is tested itself; an array there chooses for each element. */
  private boolean decides(int index) {
    return index == 0 || (signature.kind(index) == 'V' && signature.kind(0) != 'R');
  }

  private Value each(Frame frame, Value[] values, int rows, int columns) {
    for (int i = 0; i < values.length; i++) {
      values[i] = values[i] == null ? arguments[i].value(frame) : values[i];
    }
    Value[][] results = new Value[rows][columns];
    for (int r = 0; r < rows; r++) {
      for (int c = 0; c < columns; c++) {
        results[r][c] = one(frame, values, r, c);
      }
    }
    return new Value.Array(results);
  }

  private Value one(Frame frame, Value[] values, int row, int column) {
    Value[] elements = new Value[values.length];
    for (int i = 0; i < elements.length; i++) {
      elements[i] = Broadcast.element(values[i], row, column);
    }
    return one(frame, elements);
  }

  private Value one(Frame frame, Value[] values) {
    try {
      CallArguments evaluated = new CallArguments(frame, arguments, values);
      int index = selector.choose(evaluated);
      if (index >= 0) {
        return evaluated.value(index);
      }
      return index == Function.Selector.NONE ? Fault.NA.value() : new Value.Logical(false);
    } catch (FaultException e) {
      return e.value();
    }
  }

  @Override
  public Reference reference(Frame frame) {
    if (signature.kind(0) == 'R') {
      return null; // the first argument is tested for errors: a value, not a place
    }
    try {
      Value[] none = new Value[arguments.length];
      int index = selector.choose(new CallArguments(frame, arguments, none));
      return index >= 0 ? arguments[index].reference(frame) : null;
    } catch (FaultException e) {
      return null;
    }
  }
}
