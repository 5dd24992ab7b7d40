package weighhouse.audit.probe;

import java.util.ArrayList;
import java.util.List;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** The cells of a range that are worth looking at. */
public final class CellsOf {
  private CellsOf() {}

  /** The stored cells of a range, row by row. */
  public static List<CellAddress> stored(Workbook workbook, CellRange range) {
    CellStore cells = workbook.sheet(range.sheet()).cells();
    List<CellAddress> found = new ArrayList<>();
    int last = Math.min(range.lastRow(), cells.rows() - 1);
    for (int row = range.firstRow(); row <= last; row++) {
      for (int i = cells.firstOfRow(row); i < cells.firstOfRow(row + 1); i++) {
        int column = cells.column(i);
        if (column >= range.firstColumn() && column <= range.lastColumn()) {
          found.add(new CellAddress(range.sheet(), row, column));
        }
      }
    }
    return found;
  }

  /** At most so many cells spread evenly over the range, first and last among them. */
  public static List<CellAddress> spread(CellRange range, int most) {
    long size = range.size();
    int count = (int) Math.min(size, most);
    List<CellAddress> cells = new ArrayList<>(count);
    for (int i = 0; i < count; i++) {
      long at = count == 1 ? 0 : i * (size - 1) / (count - 1);
      cells.add(range.first().offset((int) (at / range.columns()), (int) (at % range.columns())));
    }
    return cells;
  }
}
