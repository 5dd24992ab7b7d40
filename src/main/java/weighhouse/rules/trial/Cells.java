package weighhouse.rules.trial;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellRange;

/** Cells and ranges by their A1 names on the one sheet of an example. */
final class Cells {
  private static final Pattern FORM = Pattern.compile("([A-Z]+)([0-9]+)(?::([A-Z]+)([0-9]+))?");

  private Cells() {}

  static CellRange range(String text) {
    Matcher matcher = FORM.matcher(text.strip());
    if (!matcher.matches()) {
      throw new IllegalArgumentException("'" + text + "' is no cell or range");
    }
    int row = Integer.parseInt(matcher.group(2)) - 1;
    int column = A1.column(matcher.group(1));
    boolean one = matcher.group(3) == null;
    return new CellRange(
        0,
        row,
        column,
        one ? row : Integer.parseInt(matcher.group(4)) - 1,
        one ? column : A1.column(matcher.group(3)));
  }
}
