package weighhouse.workbook.ooxml;

import java.util.Optional;
import weighhouse.workbook.CellRange;

/** Reads ranges such as {@code B2:D5}. */
final class Ranges {
  static final int ROWS = 1 << 20;
  static final int COLUMNS = 1 << 14;

  private Ranges() {}

  /** The range on that sheet; empty where the text is none. */
  static Optional<CellRange> parse(String text, int sheet) {
    if (text == null) {
      return Optional.empty();
    }
    String plain = text.replace("$", "").strip();
    int colon = plain.indexOf(':');
    CellReference first = new CellReference();
    CellReference last = new CellReference();
    try {
      first.decode(colon < 0 ? plain : plain.substring(0, colon));
      last.decode(colon < 0 ? plain : plain.substring(colon + 1));
    } catch (IllegalArgumentException e) {
      return Optional.empty();
    }
    if (last.row < first.row || last.column < first.column || !inside(last)) {
      return Optional.empty();
    }
    return Optional.of(new CellRange(sheet, first.row, first.column, last.row, last.column));
  }

  private static boolean inside(CellReference cell) {
    return cell.row < ROWS && cell.column < COLUMNS;
  }
}
