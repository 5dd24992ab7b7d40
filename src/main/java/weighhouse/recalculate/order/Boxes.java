package weighhouse.recalculate.order;

import java.util.ArrayList;
import java.util.List;
import weighhouse.workbook.CellRange;

/** Numbered rectangles of several sheets on their way into an index for each sheet. */
final class Boxes {
  private final List<List<CellRange>> ranges = new ArrayList<>();
  private final List<List<Integer>> numbers = new ArrayList<>();

  Boxes(int sheets) {
    for (int i = 0; i < sheets; i++) {
      ranges.add(new ArrayList<>());
      numbers.add(new ArrayList<>());
    }
  }

  void add(CellRange range, int number) {
    ranges.get(range.sheet()).add(range);
    numbers.get(range.sheet()).add(number);
  }

  void index(RectIndex[] bySheet) {
    for (int i = 0; i < bySheet.length; i++) {
      bySheet[i] = new RectIndex(ranges.get(i), numbers.get(i));
    }
  }
}
