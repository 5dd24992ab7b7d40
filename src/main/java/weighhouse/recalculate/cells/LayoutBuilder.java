package weighhouse.recalculate.cells;

import java.util.Arrays;
import weighhouse.workbook.CellRange;

/** Gathers which cells need slots, then gives them out. */
public final class LayoutBuilder {
  /** Stretches nearer than this are joined: a few idle slots cost less than another stretch. */
  private static final int GAP = 8;

  private final boolean[] across;
  private final int[][][] stretches;
  private final int[][] sizes;
  private final int[] rows;
  private final int[] columns;

  /**
   * @param across by sheet, whether its lines are its rows
   */
  public LayoutBuilder(boolean[] across) {
    this.across = across.clone();
    this.stretches = new int[across.length][0][];
    this.sizes = new int[across.length][0];
    this.rows = new int[across.length];
    this.columns = new int[across.length];
  }

  /** Gives all cells of a rectangle a slot. */
  public void add(CellRange range) {
    int sheet = range.sheet();
    rows[sheet] = Math.max(rows[sheet], range.lastRow() + 1);
    columns[sheet] = Math.max(columns[sheet], range.lastColumn() + 1);
    if (across[sheet]) {
      for (int row = range.firstRow(); row <= range.lastRow(); row++) {
        add(sheet, row, range.firstColumn(), range.lastColumn());
      }
    } else {
      for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
        add(sheet, column, range.firstRow(), range.lastRow());
      }
    }
  }

  /** Gives one cell a slot. */
  public void add(int sheet, int row, int column) {
    rows[sheet] = Math.max(rows[sheet], row + 1);
    columns[sheet] = Math.max(columns[sheet], column + 1);
    int line = across[sheet] ? row : column;
    int position = across[sheet] ? column : row;
    add(sheet, line, position, position);
  }

  private void add(int sheet, int line, int first, int last) {
    if (line >= stretches[sheet].length) {
      int length = Math.max(line + 1, stretches[sheet].length * 2);
      stretches[sheet] = Arrays.copyOf(stretches[sheet], length);
      sizes[sheet] = Arrays.copyOf(sizes[sheet], length);
    }
    int[] pairs = stretches[sheet][line];
    int size = sizes[sheet][line];
    if (pairs == null) {
      pairs = new int[4];
    } else if (first >= pairs[size - 2] && first <= pairs[size - 1] + GAP) {
      pairs[size - 1] = Math.max(pairs[size - 1], last);
      return;
    }
    if (size == pairs.length) {
      pairs = Arrays.copyOf(pairs, size * 2);
    }
    pairs[size] = first;
    pairs[size + 1] = last;
    stretches[sheet][line] = pairs;
    sizes[sheet][line] = size + 2;
  }

  public Layout build() {
    int[][][] built = new int[stretches.length][][];
    int next = Layout.NOWHERE + 1;
    for (int sheet = 0; sheet < built.length; sheet++) {
      built[sheet] = new int[stretches[sheet].length][];
      for (int line = 0; line < built[sheet].length; line++) {
        if (sizes[sheet][line] > 0) {
          built[sheet][line] = joined(stretches[sheet][line], sizes[sheet][line], next);
          next = end(built[sheet][line]);
        }
      }
    }
    return new Layout(built, across, rows, columns, next);
  }

  private static int end(int[] triples) {
    int k = triples.length - 3;
    return triples[k + 2] + triples[k + 1] - triples[k] + 1;
  }

  /** The pairs in order, near ones joined, each with its first slot. */
  private static int[] joined(int[] pairs, int size, int slot) {
    long[] sorted = new long[size / 2];
    for (int k = 0; k < size; k += 2) {
      sorted[k / 2] = (long) pairs[k] << 32 | pairs[k + 1];
    }
    Arrays.sort(sorted);
    int[] triples = new int[sorted.length * 3];
    int length = 0;
    for (long pair : sorted) {
      int first = (int) (pair >> 32);
      int last = (int) pair;
      if (length > 0 && first <= triples[length - 2] + GAP) {
        triples[length - 2] = Math.max(triples[length - 2], last);
      } else {
        triples[length] = first;
        triples[length + 1] = last;
        length += 3;
      }
    }
    int next = slot;
    for (int k = 0; k < length; k += 3) {
      triples[k + 2] = next;
      next += triples[k + 1] - triples[k] + 1;
    }
    return Arrays.copyOf(triples, length);
  }
}
