package weighhouse.quantity.label;

import java.util.ArrayList;
import java.util.List;
import weighhouse.workbook.CellStore;

/** Titles of sections: texts that stand alone, on rows without numbers. */
final class TitleRows {
  /** Titles are looked for so many back; further up they belong to other tables. */
  private static final int MOST_SKIPPED = 6;

  private record Title(int row, int column) {}

  private final List<Title> titles = new ArrayList<>();

  void find(SheetTexts texts, CellStore cells) {
    for (int i = 0; i < cells.size(); ) {
      int row = cells.row(i);
      int end = cells.firstOfRow(row + 1);
      boolean numbers = false;
      for (int k = i; k < end; k++) {
        numbers |= texts.isNumber(row, cells.column(k));
      }
      for (int k = i; k < end && !numbers; k++) {
        int column = cells.column(k);
        if (texts.isText(k) && isAlone(texts, row, column)) {
          titles.add(new Title(row, column));
        }
      }
      i = end;
    }
  }

  private static boolean isAlone(SheetTexts texts, int row, int column) {
    boolean left = column == 0 || texts.isBlank(row, column - 1);
    return left && texts.isBlank(row, column + 1);
  }

  /** The nearest title above that is not right of the column: its row and column; or null. */
  int[] above(int row, int column) {
    int low = 0;
    int high = titles.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (titles.get(middle).row() < row) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    Title best = null;
    for (int i = low - 1; i >= 0 && i >= low - MOST_SKIPPED; i--) {
      Title title = titles.get(i);
      if (best != null && title.row() < best.row()) {
        break;
      }
      if (title.column() <= column && (best == null || title.column() > best.column())) {
        best = title;
      }
    }
    return best == null ? null : new int[] {best.row(), best.column()};
  }

  /** Whether the cell is the title of a section. */
  boolean isTitle(int row, int column) {
    int[] found = above(row + 1, column);
    return found != null && found[0] == row && found[1] == column;
  }
}
