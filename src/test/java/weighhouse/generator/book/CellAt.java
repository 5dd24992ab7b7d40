package weighhouse.generator.book;

import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.util.AreaReference;
import org.apache.poi.ss.util.CellReference;

/** A cell's place, rows and columns from zero. */
public record CellAt(String sheet, int row, int column) implements Comparable<CellAt> {
  /** {@code D5}. */
  public static String a1(int row, int column) {
    return CellReference.convertNumToColString(column) + (row + 1);
  }

  /** {@code $D$5}. */
  public static String fixed(int row, int column) {
    return "$" + CellReference.convertNumToColString(column) + "$" + (row + 1);
  }

  /** {@code D$5}. */
  public static String fixedRow(int row, int column) {
    return CellReference.convertNumToColString(column) + "$" + (row + 1);
  }

  /** {@code $D5}. */
  public static String fixedColumn(int row, int column) {
    return "$" + a1(row, column);
  }

  /** First cell of a reference such as {@code Sheet!$D$5}. */
  public static CellAt of(String reference) {
    CellReference first = new AreaReference(reference, SpreadsheetVersion.EXCEL2007).getFirstCell();
    return new CellAt(first.getSheetName(), first.getRow(), first.getCol());
  }

  /** Absolute reference, with the sheet's name unless seen from that sheet. */
  public String from(String seenFrom) {
    return sheet.equals(seenFrom) ? fixed(row, column) : quoted(sheet) + "!" + fixed(row, column);
  }

  /** {@code Sheet!D5}. */
  public String text() {
    return quoted(sheet) + "!" + a1(row, column);
  }

  /** The sheet's name as Excel writes it in formulas. */
  public static String quoted(String sheet) {
    return sheet.matches("[A-Za-z_][A-Za-z0-9_]*") && !sheet.matches("[A-Za-z]{1,3}[0-9]+")
        ? sheet
        : "'" + sheet.replace("'", "''") + "'";
  }

  @Override
  public int compareTo(CellAt o) {
    int bySheet = sheet.compareTo(o.sheet);
    int byColumn = Integer.compare(column, o.column);
    return bySheet != 0 ? bySheet : byColumn != 0 ? byColumn : Integer.compare(row, o.row);
  }
}
