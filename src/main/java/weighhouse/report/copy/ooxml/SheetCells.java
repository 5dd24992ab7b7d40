package weighhouse.report.copy.ooxml;

import java.util.function.Consumer;
import weighhouse.workbook.A1;

/** Finds the cells in the text of a sheet's part. */
final class SheetCells {
  /**
   * A cell.
   *
   * @param tag its opening tag
   * @param end position after the cell
   * @param formula opening tag of its formula, or null
   * @param formulaText text of its formula, still escaped; empty where it has none of its own
   * @param rest what follows its formula (its value), still as text
   */
  record Cell(
      int row,
      int column,
      XmlText.Tag tag,
      int end,
      XmlText.Tag formula,
      String formulaText,
      String rest) {
    /** Whether the formula is of that type: {@code shared}, {@code array}, {@code dataTable}. */
    boolean is(String type) {
      return formula != null && type.equals(formula.attribute("t"));
    }
  }

  private SheetCells() {}

  /** Calls the visitor with every cell in the order of the text. */
  static void visit(String sheet, Consumer<Cell> visitor) {
    XmlText.Tag data = XmlText.opening(sheet, "sheetData", 0);
    int row = -1;
    int column = -1;
    XmlText.Tag tag = data == null ? null : XmlText.next(sheet, data.end());
    while (tag != null && !tag.localName().equals("sheetData")) {
      int end = tag.end();
      if (!tag.closes() && tag.localName().equals("row")) {
        String number = tag.attribute("r");
        row = number == null ? row + 1 : Integer.parseInt(number) - 1;
        column = -1;
      } else if (!tag.closes() && tag.localName().equals("c")) {
        String address = tag.attribute("r");
        column = address == null ? column + 1 : column(address);
        Cell cell = cell(sheet, tag, row, column);
        visitor.accept(cell);
        end = cell.end();
      }
      tag = XmlText.next(sheet, end);
    }
  }

  private static int column(String address) {
    int letters = 0;
    while (letters < address.length() && Character.isLetter(address.charAt(letters))) {
      letters++;
    }
    return A1.column(address.substring(0, letters));
  }

  private static Cell cell(String sheet, XmlText.Tag tag, int row, int column) {
    if (tag.empty()) {
      return new Cell(row, column, tag, tag.end(), null, "", "");
    }
    XmlText.Tag close = XmlText.closing(sheet, "c", tag.end());
    XmlText.Tag formula = XmlText.next(sheet, tag.end());
    if (!formula.localName().equals("f")) {
      String rest = sheet.substring(tag.end(), close.start());
      return new Cell(row, column, tag, close.end(), null, "", rest);
    }
    if (formula.empty()) {
      String rest = sheet.substring(formula.end(), close.start());
      return new Cell(row, column, tag, close.end(), formula, "", rest);
    }
    XmlText.Tag formulaEnd = XmlText.closing(sheet, "f", formula.end());
    return new Cell(
        row,
        column,
        tag,
        close.end(),
        formula,
        sheet.substring(formula.end(), formulaEnd.start()),
        sheet.substring(formulaEnd.end(), close.start()));
  }
}
