package weighhouse.quantity.label;

import java.util.function.IntConsumer;

/**
 * Finds the headings of a number's column: the nearest texts above, over numbers and blank rows.
 */
final class ColumnHeadings {
  /** Blank rows between a heading and the first number under it. */
  private static final int MOST_BLANKS = 3;

  /** Rows that one heading may take, and texts without meaning that are passed over. */
  private static final int MOST_ROWS = 4;

  private final SheetTexts texts;
  private final int column;

  ColumnHeadings(SheetTexts texts, int column) {
    this.texts = texts;
    this.column = column;
  }

  /** Calls back with the row of each heading, the nearest first. */
  void find(int row, IntConsumer found) {
    int last = -1;
    int at = texts.textAbove(row, column);
    for (int n = 0; n < MOST_ROWS && at >= 0; n++) {
      boolean belongs = last < 0 ? heads(at) : last - at <= 1;
      if (!belongs && last >= 0) {
        return;
      }
      if (belongs) {
        found.accept(at);
        last = at;
      }
      at = texts.textAbove(at, column);
    }
  }

  /** Whether the text heads its column, by the numbers under it or as one of a row of headings. */
  private boolean heads(int text) {
    boolean left = isText(text, column - 1);
    boolean inRow = left && (isText(text, column + 1) || isText(text, column - 2));
    return inRow || isOverNumber(text);
  }

  private boolean isText(int row, int at) {
    return at >= 0 && texts.at(row, at) != null;
  }

  /** Whether numbers, and no other text, follow under the text. */
  private boolean isOverNumber(int text) {
    for (int row = text + 1; row <= text + 1 + MOST_BLANKS; row++) {
      if (texts.isNumber(row, column)) {
        return true;
      }
      if (texts.at(row, column) != null) {
        return false;
      }
    }
    return false;
  }
}
