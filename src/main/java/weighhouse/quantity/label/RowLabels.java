package weighhouse.quantity.label;

import java.util.function.BiConsumer;

/** Finds the texts on a number's own row that label it. */
final class RowLabels {
  /** Descriptions stand up to seven columns right of the value, and the last column of a table. */
  private static final int REACH_RIGHT = 8;

  private static final int MOST_BLANKS = 6;
  private static final int LONGEST_UNIT = 32;

  private final SheetTexts texts;
  private final int row;
  private final int column;

  RowLabels(SheetTexts texts, int row, int column) {
    this.texts = texts;
    this.row = row;
    this.column = column;
  }

  /** Calls back with the place and column of each label, the primary one first. */
  void find(BiConsumer<Place, Integer> found) {
    if (!texts.hasText(row)) {
      return;
    }
    int left = left();
    if (left >= 0) {
      found.accept(Place.LEFT, left);
      if (left > 0 && texts.at(row, left - 1) != null) {
        found.accept(Place.LEFT, left - 1);
      }
    }
    boolean described = left >= 0 && !isName(left);
    right(described, found);
  }

  /** A short name without spaces calls for a description further right. */
  private boolean isName(int at) {
    return texts.at(row, at).strip().indexOf(' ') < 0;
  }

  /** Column of the text on the left that belongs to the same table, or -1. */
  private int left() {
    int text = texts.textLeft(row, column);
    int blanks = 0;
    boolean numbers = false;
    for (int at = column - 1; at > text && at >= 0; at--) {
      if (texts.isNumber(row, at)) {
        if (blanks > 0) {
          return -1;
        }
        numbers = true;
      } else {
        blanks++;
      }
    }
    if (text < 0 || blanks > MOST_BLANKS) {
      return -1;
    }
    boolean behindNumber = text > 0 && texts.isNumber(row, text - 1);
    if (behindNumber) {
      return blanks > 0 ? -1 : beyond(text, numbers);
    }
    return text;
  }

  /**
   * A text between numbers: where the row starts with a text it is the unit of the number before,
   * and the row's label stands further left; else it is the label of that number.
   */
  private int beyond(int text, boolean numbers) {
    int first = text;
    for (int next = text; next >= 0; next = texts.textLeft(row, next)) {
      boolean label = next == 0 || !texts.isNumber(row, next - 1);
      if (label) {
        boolean sameTable = contiguous(next, text);
        return sameTable && (isShortUnit(text) || numbers) ? next : text;
      }
      first = next;
    }
    return startsWithNumber(first) ? -1 : text;
  }

  private boolean contiguous(int from, int to) {
    for (int at = from; at < to; at++) {
      if (texts.isBlank(row, at)) {
        return false;
      }
    }
    return true;
  }

  private boolean isShortUnit(int at) {
    return texts.at(row, at).length() <= LONGEST_UNIT;
  }

  private boolean startsWithNumber(int text) {
    int at = text - 1;
    while (at > 0 && texts.isNumber(row, at)) {
      at--;
    }
    return texts.isNumber(row, Math.max(0, at)) || texts.isBlank(row, Math.max(0, at));
  }

  private void right(boolean labelled, BiConsumer<Place, Integer> found) {
    int blanks = 0;
    boolean first = true;
    int most = labelled ? 2 : REACH_RIGHT;
    for (int at = column + 1; at <= column + REACH_RIGHT && blanks <= most; at++) {
      if (texts.at(row, at) == null) {
        blanks = texts.isBlank(row, at) ? blanks + 1 : 0;
        continue;
      }
      boolean beforeNumber = texts.isNumber(row, at + 1);
      if (!labelled) {
        found.accept(first ? Place.RIGHT : Place.DESCRIPTION, at);
      } else if (at == column + 1 && isShortUnit(at)) {
        found.accept(Place.UNIT, at);
      } else if (!beforeNumber && blanks == 0) {
        found.accept(Place.DESCRIPTION, at);
      }
      first = false;
      blanks = 0;
    }
  }
}
