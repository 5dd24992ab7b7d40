package weighhouse.quantity.label;

import weighhouse.quantity.vocabulary.Reading;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;

/**
 * A text that may label a number.
 *
 * @param text as written
 * @param place where it stands towards the number
 * @param where the cell that holds it; null of names and sheets
 * @param reading what the vocabulary reads in it
 */
public record Label(String text, Place place, CellAddress where, Reading reading) {
  private static final int LONGEST_QUOTE = 60;

  /** For people: {@code heading 'HR (95% CI)' in C3}. */
  String sentence() {
    String shown = text.strip();
    if (shown.length() > LONGEST_QUOTE) {
      shown = shown.substring(0, LONGEST_QUOTE) + "...";
    }
    String quoted = place.words() + " '" + shown + "'";
    boolean placed = where != null && place != Place.COMMENT;
    return placed ? quoted + " in " + A1.cell(where.row(), where.column()) : quoted;
  }
}
