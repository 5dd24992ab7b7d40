package weighhouse.recalculate.functions;

import java.util.function.IntFunction;
import java.util.regex.Pattern;
import weighhouse.recalculate.Value;

/** The searches behind MATCH, VLOOKUP and XLOOKUP in a row of values; -1 where nothing is found. */
final class Search {
  private final IntFunction<Value> values;
  private final int size;
  private final Value sought;

  private Search(IntFunction<Value> values, int size, Value sought) {
    this.values = values;
    this.size = size;
    this.sought = sought instanceof Value.Blank ? new Value.Num(0) : Coerce.sound(sought);
  }

  /** Along the longer side of a rectangle of one row or one column. */
  static Search along(Grid grid, Value sought) {
    if (grid.columns() == 1) {
      return inColumn(grid, 0, sought);
    }
    if (grid.rows() != 1) {
      throw Fault.NA.exception();
    }
    return inRow(grid, 0, sought);
  }

  static Search inColumn(Grid grid, int column, Value sought) {
    return new Search(i -> grid.at(i, column), grid.usedRows(), sought);
  }

  static Search inRow(Grid grid, int row, Value sought) {
    return new Search(i -> grid.at(row, i), grid.usedColumns(), sought);
  }

  /** First (or last) value that equals, with wildcards if asked for. */
  int exact(boolean wildcards, boolean fromEnd) {
    Pattern pattern =
        wildcards && sought instanceof Value.Text t && Wildcard.has(t.value())
            ? Wildcard.pattern(t.value())
            : null;
    for (int i = 0; i < size; i++) {
      int at = fromEnd ? size - 1 - i : i;
      Value value = values.apply(at);
      boolean equal =
          pattern == null
              ? comparable(value) && Order.equal(value, sought)
              : value instanceof Value.Text t && pattern.matcher(t.value()).matches();
      if (equal) {
        return at;
      }
    }
    return -1;
  }

  /**
   * Last value not above the sought one, by halving as Excel does, so that values out of order give
   * what Excel gives. Descending: last value not below it.
   */
  int halving(boolean descending) {
    int low = 0;
    int high = size - 1;
    int found = -1;
    while (low <= high) {
      int middle = (low + high) >>> 1;
      int at = middle;
      while (at <= high && !comparable(values.apply(at))) {
        at++;
      }
      if (at > high) {
        high = middle - 1;
        continue;
      }
      int order = Order.compare(values.apply(at), sought);
      if (descending ? order >= 0 : order <= 0) {
        found = at;
        low = at + 1;
      } else {
        high = middle - 1;
      }
    }
    return found;
  }

  /**
   * Equal value, else the largest below (sign -1) or smallest above (sign 1), wherever it stands.
   */
  int nearest(int sign, boolean fromEnd) {
    int best = exact(false, fromEnd);
    if (best >= 0) {
      return best;
    }
    for (int i = 0; i < size; i++) {
      int at = fromEnd ? size - 1 - i : i;
      Value value = values.apply(at);
      boolean onSide = comparable(value) && sign * Order.compare(value, sought) > 0;
      if (onSide && (best < 0 || sign * Order.compare(value, values.apply(best)) < 0)) {
        best = at;
      }
    }
    return best;
  }

  private boolean comparable(Value value) {
    return value.getClass() == sought.getClass();
  }
}
