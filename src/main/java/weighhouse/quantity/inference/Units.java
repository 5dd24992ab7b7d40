package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** All units of a workbook, found by cell. */
final class Units {
  static final int NONE = -1;

  private final Workbook workbook;
  private final List<Unit> units = new ArrayList<>();
  private final int[][] unitOf;

  /** Whether units were made of parts of others, so that a unit may end before its range does. */
  private boolean cut;

  Units(Workbook workbook) {
    this.workbook = workbook;
    unitOf = new int[workbook.sheets().size()][];
    for (int sheet = 0; sheet < unitOf.length; sheet++) {
      unitOf[sheet] = new int[workbook.sheet(sheet).cells().size()];
      Arrays.fill(unitOf[sheet], NONE);
    }
  }

  int size() {
    return units.size();
  }

  Unit get(int id) {
    return units.get(id);
  }

  List<Unit> all() {
    return units;
  }

  /** Makes a unit of the stored cells of a range; those that had one before leave it. */
  Unit add(CellRange range, Expr tree) {
    Unit unit = new Unit(units.size(), range, tree);
    units.add(unit);
    CellStore cells = cells(range.sheet());
    for (int row = range.firstRow(); row <= range.lastRow(); row++) {
      for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
        int index = cells.find(row, column);
        if (index >= 0) {
          cut |= unitOf[range.sheet()][index] != NONE;
          unitOf[range.sheet()][index] = unit.id;
        }
      }
    }
    return unit;
  }

  private CellStore cells(int sheet) {
    return workbook.sheet(sheet).cells();
  }

  /** The cells of a unit that no other unit took since; always from its first cell on. */
  CellRange owned(Unit unit) {
    CellRange range = unit.range;
    Lines lines = new Lines(range.columns() == 1);
    if (range.size() == 1 || !lines.isLine(range) || at(range.last()) == unit) {
      return range;
    }
    int length = 1;
    while (at(lines.later(range.first(), length)) == unit) {
      length++;
    }
    CellAddress last = lines.later(range.first(), length - 1);
    return new CellRange(
        range.sheet(), range.firstRow(), range.firstColumn(), last.row(), last.column());
  }

  /** The unit of a cell, or null. */
  Unit at(CellAddress cell) {
    if (cell.row() < 0 || cell.column() < 0) {
      return null;
    }
    int index = cells(cell.sheet()).find(cell.row(), cell.column());
    return index < 0 || unitOf[cell.sheet()][index] < 0
        ? null
        : units.get(unitOf[cell.sheet()][index]);
  }

  boolean isTaken(int sheet, int index) {
    return unitOf[sheet][index] != NONE;
  }

  /** The range without rows and columns behind the last stored cell; null if nothing is left. */
  CellRange clip(CellRange range) {
    CellStore cells = cells(range.sheet());
    int lastRow = Math.min(range.lastRow(), cells.rows() - 1);
    int lastColumn = Math.min(range.lastColumn(), cells.columns() - 1);
    return lastRow < range.firstRow() || lastColumn < range.firstColumn()
        ? null
        : new CellRange(range.sheet(), range.firstRow(), range.firstColumn(), lastRow, lastColumn);
  }

  /** The units with cells in a range, each once, up to a number of them. */
  List<Unit> in(CellRange range, int most) {
    CellRange clipped = clip(range);
    if (clipped == null) {
      return List.of();
    } else if (clipped.size() == 1) {
      Unit unit = at(clipped.first());
      return unit == null ? List.of() : List.of(unit);
    }
    List<Unit> found = new ArrayList<>();
    BitSet seen = new BitSet();
    for (int column = clipped.firstColumn(); column <= clipped.lastColumn(); column++) {
      int row = clipped.firstRow();
      while (row <= clipped.lastRow() && found.size() < most) {
        Unit unit = at(new CellAddress(clipped.sheet(), row, column));
        if (unit != null && !seen.get(unit.id)) {
          seen.set(unit.id);
          found.add(unit);
        }
        row = unit == null || cut ? row + 1 : Math.max(row + 1, unit.range.lastRow() + 1);
      }
    }
    return found;
  }
}
