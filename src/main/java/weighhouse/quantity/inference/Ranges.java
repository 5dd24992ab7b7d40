package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;
import weighhouse.quantity.Quantity;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Joins neighbouring ranges of one quantity, first down, then across. */
final class Ranges {
  private Ranges() {}

  static List<CellRange> joined(List<CellRange> ranges, Function<CellAddress, Quantity> quantity) {
    Comparator<CellRange> bySheet = Comparator.comparingInt(CellRange::sheet);
    List<CellRange> down = new ArrayList<>(ranges);
    down.sort(
        bySheet
            .thenComparingInt(CellRange::firstColumn)
            .thenComparingInt(CellRange::lastColumn)
            .thenComparingInt(CellRange::firstRow));
    List<CellRange> columns = pass(down, quantity, true);
    columns.sort(
        bySheet
            .thenComparingInt(CellRange::firstRow)
            .thenComparingInt(CellRange::lastRow)
            .thenComparingInt(CellRange::firstColumn));
    List<CellRange> blocks = pass(columns, quantity, false);
    blocks.sort(Comparator.comparing(CellRange::first));
    return blocks;
  }

  private static List<CellRange> pass(
      List<CellRange> ranges, Function<CellAddress, Quantity> quantity, boolean down) {
    List<CellRange> joined = new ArrayList<>();
    for (CellRange range : ranges) {
      CellRange last = joined.isEmpty() ? null : joined.get(joined.size() - 1);
      boolean joins =
          last != null
              && touch(last, range, down)
              && quantity.apply(last.first()).equals(quantity.apply(range.first()));
      if (joins) {
        joined.set(joined.size() - 1, hull(last, range));
      } else {
        joined.add(range);
      }
    }
    return joined;
  }

  private static boolean touch(CellRange a, CellRange b, boolean down) {
    if (a.sheet() != b.sheet()) {
      return false;
    }
    return down
        ? a.firstColumn() == b.firstColumn()
            && a.lastColumn() == b.lastColumn()
            && a.lastRow() + 1 == b.firstRow()
        : a.firstRow() == b.firstRow()
            && a.lastRow() == b.lastRow()
            && a.lastColumn() + 1 == b.firstColumn();
  }

  private static CellRange hull(CellRange a, CellRange b) {
    return new CellRange(a.sheet(), a.firstRow(), a.firstColumn(), b.lastRow(), b.lastColumn());
  }
}
