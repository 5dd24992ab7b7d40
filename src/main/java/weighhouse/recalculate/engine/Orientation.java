package weighhouse.recalculate.engine;

import java.util.List;
import weighhouse.formula.Region;

/** Whether the formulas of a sheet are filled down, as usual, or across. */
final class Orientation {
  private Orientation() {}

  static boolean[] of(int sheets, List<Region> regions) {
    long[] down = new long[sheets];
    long[] across = new long[sheets];
    for (Region region : regions) {
      int rows = region.range().rows();
      int columns = region.range().columns();
      int sheet = region.range().sheet();
      if (rows >= columns) {
        down[sheet] += (long) (rows - 1) * columns;
      } else {
        across[sheet] += (long) (columns - 1) * rows;
      }
    }
    boolean[] result = new boolean[sheets];
    for (int i = 0; i < sheets; i++) {
      result[i] = across[i] > down[i];
    }
    return result;
  }
}
