package weighhouse.workbook;

import java.util.Arrays;

/** Where the cells of each used row start, among cells in the order of rows. */
final class RowIndex {
  private final int[] rows;
  private final int[] starts;
  private final int size;

  RowIndex(int[] rowOfCell, int size) {
    this.size = size;
    int used = 0;
    for (int i = 0; i < size; i++) {
      used += i == 0 || rowOfCell[i] != rowOfCell[i - 1] ? 1 : 0;
    }
    rows = new int[used];
    starts = new int[used];
    int next = 0;
    for (int i = 0; i < size; i++) {
      if (i == 0 || rowOfCell[i] != rowOfCell[i - 1]) {
        rows[next] = rowOfCell[i];
        starts[next++] = i;
      }
    }
  }

  /** First cell in that row or after it. */
  int firstOf(int row) {
    int position = position(row);
    position = position < 0 ? -position - 1 : position;
    return position == rows.length ? size : starts[position];
  }

  /** Place of the row among the used ones, or (-(where it would stand) - 1). */
  int position(int row) {
    if (rows.length == 0 || row < rows[0]) {
      return -1;
    }
    int most = (int) Math.min(rows.length - 1, (long) row - rows[0]);
    return rows[most] == row ? most : Arrays.binarySearch(rows, 0, most + 1, row);
  }

  int start(int position) {
    return starts[position];
  }

  int end(int position) {
    return position + 1 == starts.length ? size : starts[position + 1];
  }

  /** One more than the last used row. */
  int rows() {
    return rows.length == 0 ? 0 : rows[rows.length - 1] + 1;
  }
}
