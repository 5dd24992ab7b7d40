package weighhouse.recalculate.order;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.IntConsumer;
import weighhouse.workbook.CellRange;

/**
 * Finds the rectangles of one sheet that meet a given one. A packed R-tree (sort-tile-recursive,
 * Leutenegger, Lopez and Edgington 1997), so a search costs about the logarithm of their number.
 */
final class RectIndex {
  private static final int FANOUT = 8;

  /** By level from the leaves up: four bounds for each box. */
  private final List<int[]> levels = new ArrayList<>();

  private final int[] ids;

  /**
   * @param boxes rectangles
   * @param numbers what a search answers with for each
   */
  RectIndex(List<CellRange> boxes, List<Integer> numbers) {
    int[] sorted = tiled(boxes);
    ids = new int[sorted.length];
    int[] leaves = new int[sorted.length * 4];
    for (int i = 0; i < sorted.length; i++) {
      CellRange box = boxes.get(sorted[i]);
      ids[i] = numbers.get(sorted[i]);
      leaves[4 * i] = box.firstRow();
      leaves[4 * i + 1] = box.firstColumn();
      leaves[4 * i + 2] = box.lastRow();
      leaves[4 * i + 3] = box.lastColumn();
    }
    levels.add(leaves);
    while (levels.get(levels.size() - 1).length > 4 * FANOUT) {
      levels.add(above(levels.get(levels.size() - 1)));
    }
  }

  private static int[] tiled(List<CellRange> boxes) {
    int slices = Math.max(1, (int) Math.sqrt(boxes.size() / (double) FANOUT));
    int perSlice = Math.max(1, (boxes.size() + slices - 1) / slices);
    Integer[] order = new Integer[boxes.size()];
    for (int i = 0; i < order.length; i++) {
      order[i] = i;
    }
    java.util.Arrays.sort(order, Comparator.comparingInt(i -> boxes.get(i).firstColumn()));
    for (int from = 0; from < order.length; from += perSlice) {
      int to = Math.min(order.length, from + perSlice);
      java.util.Arrays.sort(order, from, to, Comparator.comparingInt(i -> boxes.get(i).firstRow()));
    }
    int[] sorted = new int[order.length];
    for (int i = 0; i < sorted.length; i++) {
      sorted[i] = order[i];
    }
    return sorted;
  }

  private static int[] above(int[] boxes) {
    int count = boxes.length / 4;
    int[] upper = new int[(count + FANOUT - 1) / FANOUT * 4];
    for (int i = 0; i < upper.length / 4; i++) {
      int[] box = {Integer.MAX_VALUE, Integer.MAX_VALUE, -1, -1};
      for (int k = i * FANOUT; k < Math.min(count, (i + 1) * FANOUT); k++) {
        box[0] = Math.min(box[0], boxes[4 * k]);
        box[1] = Math.min(box[1], boxes[4 * k + 1]);
        box[2] = Math.max(box[2], boxes[4 * k + 2]);
        box[3] = Math.max(box[3], boxes[4 * k + 3]);
      }
      System.arraycopy(box, 0, upper, 4 * i, 4);
    }
    return upper;
  }

  /** Answers with the number of each rectangle that meets the range. */
  void search(CellRange range, IntConsumer found) {
    int top = levels.size() - 1;
    search(top, 0, levels.get(top).length / 4, range, found);
  }

  private void search(int level, int from, int to, CellRange range, IntConsumer found) {
    int[] boxes = levels.get(level);
    for (int i = from; i < to; i++) {
      boolean meets =
          boxes[4 * i] <= range.lastRow()
              && boxes[4 * i + 2] >= range.firstRow()
              && boxes[4 * i + 1] <= range.lastColumn()
              && boxes[4 * i + 3] >= range.firstColumn();
      if (meets && level == 0) {
        found.accept(ids[i]);
      } else if (meets) {
        int below = levels.get(level - 1).length / 4;
        search(level - 1, i * FANOUT, Math.min(below, (i + 1) * FANOUT), range, found);
      }
    }
  }
}
