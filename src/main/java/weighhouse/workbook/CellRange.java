package weighhouse.workbook;

/** A rectangle of cells on one sheet; all bounds are zero-based and inclusive. */
public record CellRange(int sheet, int firstRow, int firstColumn, int lastRow, int lastColumn) {

  /** The range that holds one cell. */
  public static CellRange of(CellAddress cell) {
    return new CellRange(cell.sheet(), cell.row(), cell.column(), cell.row(), cell.column());
  }

  public boolean contains(CellAddress cell) {
    return cell.sheet() == sheet
        && cell.row() >= firstRow
        && cell.row() <= lastRow
        && cell.column() >= firstColumn
        && cell.column() <= lastColumn;
  }

  /** Whether the two have a cell in common. */
  public boolean overlaps(CellRange other) {
    return sheet == other.sheet
        && firstRow <= other.lastRow
        && other.firstRow <= lastRow
        && firstColumn <= other.lastColumn
        && other.firstColumn <= lastColumn;
  }

  public int rows() {
    return lastRow - firstRow + 1;
  }

  public int columns() {
    return lastColumn - firstColumn + 1;
  }

  public long size() {
    return (long) rows() * columns();
  }

  public CellAddress first() {
    return new CellAddress(sheet, firstRow, firstColumn);
  }

  public CellAddress last() {
    return new CellAddress(sheet, lastRow, lastColumn);
  }
}
