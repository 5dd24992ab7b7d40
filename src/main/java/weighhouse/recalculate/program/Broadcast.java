package weighhouse.recalculate.program;

import java.util.function.BinaryOperator;
import java.util.function.UnaryOperator;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.FaultException;

/** Operations on single values carried over arrays, one row or column repeated as needed. */
final class Broadcast {
  private Broadcast() {}

  /** The operation on each pair; {@code #N/A} where only one of two sizes has a place. */
  static Value pairs(Value a, Value b, BinaryOperator<Value> operation) {
    if (!(a instanceof Value.Array) && !(b instanceof Value.Array)) {
      return guarded(a, b, operation);
    }
    int rows = Math.max(rows(a), rows(b));
    int columns = Math.max(columns(a), columns(b));
    Value[][] results = new Value[rows][columns];
    for (int r = 0; r < rows; r++) {
      for (int c = 0; c < columns; c++) {
        results[r][c] = guarded(element(a, r, c), element(b, r, c), operation);
      }
    }
    return new Value.Array(results);
  }

  static Value each(Value value, UnaryOperator<Value> operation) {
    return pairs(value, new Value.Blank(), (v, ignored) -> operation.apply(v));
  }

  private static Value guarded(Value a, Value b, BinaryOperator<Value> operation) {
    if (a instanceof Value.Fault) {
      return a;
    }
    if (b instanceof Value.Fault) {
      return b;
    }
    try {
      return operation.apply(a, b);
    } catch (FaultException e) {
      return e.value();
    }
  }

  static int rows(Value value) {
    return value instanceof Value.Array array ? array.rows().length : 1;
  }

  static int columns(Value value) {
    if (value instanceof Value.Array array) {
      return array.rows().length == 0 ? 0 : array.rows()[0].length;
    }
    return 1;
  }

  static Value element(Value value, int row, int column) {
    if (!(value instanceof Value.Array array)) {
      return value;
    }
    Value[][] rows = array.rows();
    int r = rows.length == 1 ? 0 : row;
    if (r >= rows.length) {
      return Fault.NA.value();
    }
    int c = rows[r].length == 1 ? 0 : column;
    return c < rows[r].length ? rows[r][c] : Fault.NA.value();
  }

  static double number(Value value) {
    return Coerce.number(value);
  }
}
