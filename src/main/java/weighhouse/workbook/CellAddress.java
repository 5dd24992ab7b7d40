package weighhouse.workbook;

/**
 * The address of one cell.
 *
 * @param sheet zero-based index of the sheet in the workbook
 * @param row zero-based row
 * @param column zero-based column
 */
public record CellAddress(int sheet, int row, int column) implements Comparable<CellAddress> {

  /** The cell so many rows and columns away on the same sheet. */
  public CellAddress offset(int rows, int columns) {
    return new CellAddress(sheet, row + rows, column + columns);
  }

  @Override
  public int compareTo(CellAddress other) {
    int bySheet = Integer.compare(sheet, other.sheet);
    if (bySheet != 0) {
      return bySheet;
    }
    int byRow = Integer.compare(row, other.row);
    return byRow != 0 ? byRow : Integer.compare(column, other.column);
  }
}
