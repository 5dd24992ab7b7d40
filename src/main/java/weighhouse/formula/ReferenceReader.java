package weighhouse.formula;

import java.util.regex.Pattern;
import org.antlr.v4.runtime.Token;
import weighhouse.workbook.A1;

/** Reads {@code $A$1}, {@code $A} and {@code $1} relative to the cell that hosts the formula. */
final class ReferenceReader {
  static final int ROWS = 1 << 20;
  static final int COLUMNS = 1 << 14;

  private static final Pattern COLUMN = Pattern.compile("\\$?[A-Za-z]{1,3}");
  private static final Pattern ROW = Pattern.compile("\\$?[0-9]{1,7}");

  private final int hostRow;
  private final int hostColumn;

  ReferenceReader(int hostRow, int hostColumn) {
    this.hostRow = hostRow;
    this.hostColumn = hostColumn;
  }

  /** A cell; beyond the sheet's last row or column such text is a name. */
  Expr cell(SheetRef sheet, Token token) throws FormulaSyntaxException {
    String text = token.getText();
    int digits = text.length();
    while (Character.isDigit(text.charAt(digits - 1))) {
      digits--;
    }
    boolean rowAbsolute = text.charAt(digits - 1) == '$';
    boolean columnAbsolute = text.charAt(0) == '$';
    String letters = text.substring(columnAbsolute ? 1 : 0, rowAbsolute ? digits - 1 : digits);
    String number = text.substring(digits);
    int row = number.length() > 7 ? ROWS : Integer.parseInt(number) - 1;
    int column = A1.column(letters);
    if (row >= ROWS || column >= COLUMNS) {
      if (rowAbsolute || columnAbsolute) {
        throw new FormulaSyntaxException(text + " is outside the sheet", token.getStartIndex());
      }
      return new Expr.NameRef(sheet, text);
    }
    return new Expr.CellRef(sheet, rowAxis(row, rowAbsolute), columnAxis(column, columnAbsolute));
  }

  /** One end of whole columns, {@code A} or {@code $A}; null of other text. */
  Axis column(String text) {
    if (!COLUMN.matcher(text).matches()) {
      return null;
    }
    boolean absolute = text.startsWith("$");
    int column = A1.column(absolute ? text.substring(1) : text);
    return column < COLUMNS ? columnAxis(column, absolute) : null;
  }

  /** One end of whole rows, {@code 1} or {@code $1}; null of other text. */
  Axis row(String text) {
    if (!ROW.matcher(text).matches()) {
      return null;
    }
    boolean absolute = text.startsWith("$");
    int row = Integer.parseInt(absolute ? text.substring(1) : text) - 1;
    return row >= 0 && row < ROWS ? rowAxis(row, absolute) : null;
  }

  Axis rowAxis(int row, boolean absolute) {
    return new Axis(absolute ? row : row - hostRow, absolute);
  }

  Axis columnAxis(int column, boolean absolute) {
    return new Axis(absolute ? column : column - hostColumn, absolute);
  }
}
