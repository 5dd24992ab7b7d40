package weighhouse.recalculate.engine;

import java.util.ArrayList;
import java.util.List;
import weighhouse.workbook.CellRange;

/** A rectangle with another cut out. */
final class Cuts {
  private Cuts() {}

  /** The up to four rectangles that are left. */
  static List<CellRange> without(CellRange range, CellRange cut) {
    int top = Math.max(range.firstRow(), cut.firstRow());
    int left = Math.max(range.firstColumn(), cut.firstColumn());
    int bottom = Math.min(range.lastRow(), cut.lastRow());
    int right = Math.min(range.lastColumn(), cut.lastColumn());
    if (top > bottom || left > right || range.sheet() != cut.sheet()) {
      return List.of(range);
    }
    List<CellRange> rest = new ArrayList<>();
    int sheet = range.sheet();
    if (top > range.firstRow()) {
      rest.add(
          new CellRange(sheet, range.firstRow(), range.firstColumn(), top - 1, range.lastColumn()));
    }
    if (bottom < range.lastRow()) {
      rest.add(
          new CellRange(
              sheet, bottom + 1, range.firstColumn(), range.lastRow(), range.lastColumn()));
    }
    if (left > range.firstColumn()) {
      rest.add(new CellRange(sheet, top, range.firstColumn(), bottom, left - 1));
    }
    if (right < range.lastColumn()) {
      rest.add(new CellRange(sheet, top, right + 1, bottom, range.lastColumn()));
    }
    return rest;
  }
}
