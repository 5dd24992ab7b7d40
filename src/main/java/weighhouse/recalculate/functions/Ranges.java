package weighhouse.recalculate.functions;

import weighhouse.workbook.CellRange;

/** Parts of rectangles of cells, and the sheet's edges. */
final class Ranges {
  static final int LAST_ROW = 1_048_575;
  static final int LAST_COLUMN = 16_383;

  private Ranges() {}

  static CellRange row(CellRange area, int row) {
    int at = area.firstRow() + row;
    return new CellRange(area.sheet(), at, area.firstColumn(), at, area.lastColumn());
  }

  static CellRange column(CellRange area, int column) {
    int at = area.firstColumn() + column;
    return new CellRange(area.sheet(), area.firstRow(), at, area.lastRow(), at);
  }

  /** A rectangle by its corner and size; {@code #REF!} beyond the sheet's edges. */
  static CellRange of(int sheet, long row, long column, long rows, long columns) {
    long top = rows < 0 ? row + rows + 1 : row;
    long left = columns < 0 ? column + columns + 1 : column;
    long bottom = top + Math.abs(rows) - 1;
    long right = left + Math.abs(columns) - 1;
    if (rows == 0 || columns == 0 || top < 0 || left < 0) {
      throw Fault.REF.exception();
    }
    if (bottom > LAST_ROW || right > LAST_COLUMN) {
      throw Fault.REF.exception();
    }
    return new CellRange(sheet, (int) top, (int) left, (int) bottom, (int) right);
  }
}
