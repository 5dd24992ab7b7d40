package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;
import weighhouse.workbook.CellRange;

/** Functions that find a value by another. */
final class LookupFunctions {
  private LookupFunctions() {}

  static void enter(Entries entries) {
    entries.general("MATCH", "VAv", LookupFunctions::match);
    entries.general("XMATCH", "VAvv", a -> Coerce.of(1 + found(extended(a, 2))));
    entries.general("VLOOKUP", "VAVv", a -> table(a, true));
    entries.general("HLOOKUP", "VAVv", a -> table(a, false));
    entries.locating("LOOKUP", "VAa", LookupFunctions::locateVector, LookupFunctions::vector);
    entries.locating("XLOOKUP", "VAArvv", LookupFunctions::locate, LookupFunctions::xlookup);
  }

  private static int found(int index) {
    if (index < 0) {
      throw Fault.NA.exception();
    }
    return index;
  }

  private static Value match(Arguments a) {
    double type = a.missing(2) && a.count() < 3 ? 1 : a.number(2, 0);
    Search search = Search.along(a.grid(1), a.value(0));
    int index = type == 0 ? search.exact(true, false) : search.halving(type < 0);
    return Coerce.of(1 + found(index));
  }

  private static Value table(Arguments a, boolean vertical) {
    Grid grid = a.grid(1);
    int index = a.integer(2) - 1;
    if (index < 0) {
      throw Fault.VALUE.exception();
    }
    if (index >= (vertical ? grid.columns() : grid.rows())) {
      throw Fault.REF.exception();
    }
    boolean exact = a.count() > 3 && (a.missing(3) || !a.logical(3));
    Search search =
        vertical ? Search.inColumn(grid, 0, a.value(0)) : Search.inRow(grid, 0, a.value(0));
    int at = found(exact ? search.exact(true, false) : search.halving(false));
    return vertical ? grid.at(at, index) : grid.at(index, at);
  }

  /** With one rectangle, searches its longer side's first line and answers from its last. */
  private static Value vector(Arguments a) {
    Grid grid = a.grid(1);
    boolean across = grid.columns() > grid.rows();
    Search search =
        across ? Search.inRow(grid, 0, a.value(0)) : Search.inColumn(grid, 0, a.value(0));
    int at = found(search.halving(false));
    if (!a.missing(2)) {
      Grid results = a.grid(2);
      return results.columns() == 1 ? results.at(at, 0) : results.at(0, at);
    }
    return across ? grid.at(grid.rows() - 1, at) : grid.at(at, grid.columns() - 1);
  }

  private static Reference locateVector(Arguments a) {
    return null;
  }

  /** Position by XLOOKUP's and XMATCH's modes, which start at an argument. */
  private static int extended(Arguments a, int modes) {
    int match = a.integer(modes, 0);
    int order = a.integer(modes + 1, 1);
    Search search = Search.along(a.grid(1), a.value(0));
    if (Math.abs(order) == 2) {
      int at = search.halving(order < 0);
      return match == 0 && at >= 0 && !equalAt(a, at) ? -1 : at;
    }
    boolean fromEnd = order < 0;
    return match == 0 || match == 2
        ? search.exact(match == 2, fromEnd)
        : search.nearest(match, fromEnd);
  }

  private static boolean equalAt(Arguments a, int at) {
    return Order.equal(a.grid(1).at(at), a.value(0));
  }

  private static Reference locate(Arguments a) {
    Reference results = a.reference(2);
    if (results == null || results.areas().size() != 1) {
      return null;
    }
    int at = extended(a, 4);
    if (at < 0) {
      return a.missing(3) ? null : a.reference(3);
    }
    CellRange area = results.area();
    boolean down = a.grid(1).columns() == 1;
    return Reference.of(down ? Ranges.row(area, at) : Ranges.column(area, at));
  }

  private static Value xlookup(Arguments a) {
    int at = extended(a, 4);
    if (at < 0) {
      return a.missing(3) ? Fault.NA.value() : a.value(3);
    }
    Grid results = a.grid(2);
    boolean down = a.grid(1).columns() == 1;
    int length = down ? results.columns() : results.rows();
    Value[][] line = down ? new Value[1][length] : new Value[length][1];
    for (int i = 0; i < length; i++) {
      if (down) {
        line[0][i] = results.at(at, i);
      } else {
        line[i][0] = results.at(i, at);
      }
    }
    return length == 1 ? line[0][0] : new Value.Array(line);
  }
}
