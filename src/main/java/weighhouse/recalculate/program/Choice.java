package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Reference;

/** IF: evaluates only the branch that it takes. */
final class Choice extends Node {
  private final Node condition;
  private final Node whenTrue;
  private final Node whenFalse;

  Choice(Node condition, Node whenTrue, Node whenFalse) {
    this.condition = condition;
    this.whenTrue = whenTrue;
    this.whenFalse = whenFalse;
  }

  @Override
  public double number(Frame frame) {
    double test = condition.number(frame);
    if (Double.isNaN(test)) {
      return Double.NaN;
    }
    return test != 0 ? whenTrue.number(frame) : whenFalse.number(frame);
  }

  @Override
  public double plain(Frame frame) {
    double test = condition.number(frame);
    if (Double.isNaN(test)) {
      return Double.NaN;
    }
    return test != 0 ? whenTrue.plain(frame) : whenFalse.plain(frame);
  }

  @Override
  public Value value(Frame frame) {
    Value test = condition.value(frame);
    if (test instanceof Value.Array array) {
      return each(array, frame);
    }
    try {
      return Coerce.logical(test) ? whenTrue.value(frame) : whenFalse.value(frame);
    } catch (FaultException e) {
      return e.value();
    }
  }

  private Value each(Value.Array tests, Frame frame) {
    Value yes = whenTrue.value(frame);
    Value no = whenFalse.value(frame);
    Value both = Broadcast.pairs(tests, wide(yes, no), (test, ignored) -> test);
    int rows = Broadcast.rows(both);
    int columns = Broadcast.columns(both);
    Value[][] chosen = new Value[rows][columns];
    for (int r = 0; r < rows; r++) {
      for (int c = 0; c < columns; c++) {
        chosen[r][c] = chosen(Broadcast.element(tests, r, c), yes, no, r, c);
      }
    }
    return new Value.Array(chosen);
  }

  /** Blanks over the size of the larger of two values. */
  private static Value wide(Value a, Value b) {
    int rows = Math.max(Broadcast.rows(a), Broadcast.rows(b));
    int columns = Math.max(Broadcast.columns(a), Broadcast.columns(b));
    Value[][] blanks = new Value[rows][columns];
    for (Value[] row : blanks) {
      java.util.Arrays.fill(row, new Value.Blank());
    }
    return new Value.Array(blanks);
  }

  private static Value chosen(Value test, Value yes, Value no, int row, int column) {
    try {
      return Broadcast.element(Coerce.logical(test) ? yes : no, row, column);
    } catch (FaultException e) {
      return e.value();
    }
  }

  @Override
  public Reference reference(Frame frame) {
    Value test = condition.value(frame);
    if (test instanceof Value.Array || test instanceof Value.Fault) {
      return null;
    }
    try {
      return Coerce.logical(test) ? whenTrue.reference(frame) : whenFalse.reference(frame);
    } catch (FaultException e) {
      return null;
    }
  }
}
