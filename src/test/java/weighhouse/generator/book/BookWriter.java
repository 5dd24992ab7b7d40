package weighhouse.generator.book;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.Name;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.util.AreaReference;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFTable;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Writes a drafted workbook as .xlsx; formulas carry no stored values. */
public final class BookWriter {
  private final XSSFWorkbook workbook = new XSSFWorkbook();
  private final Map<String, CellStyle> styles = new HashMap<>();

  private BookWriter() {}

  /** Writes the file, replacing one of that name. */
  public static void write(Book book, Path file) throws IOException {
    BookWriter writer = new BookWriter();
    try (XSSFWorkbook workbook = writer.workbook;
        OutputStream out = Files.newOutputStream(file)) {
      writer.fill(book);
      workbook.write(out);
    }
  }

  private void fill(Book book) {
    workbook.setCellFormulaValidation(false);
    book.sheets().forEach(draft -> workbook.createSheet(draft.name()));
    book.names().forEach(this::define);
    book.sheets().forEach(this::fill);
    book.tables().forEach(this::table);
    for (SheetDraft draft : book.sheets()) {
      workbook.setSheetHidden(workbook.getSheetIndex(draft.name()), draft.hidden());
    }
  }

  private void define(Book.Name draft) {
    Name name = workbook.createName();
    name.setNameName(draft.name());
    if (draft.sheet() != null) {
      name.setSheetIndex(workbook.getSheetIndex(draft.sheet()));
    }
    name.setRefersToFormula(draft.refersTo());
  }

  private void fill(SheetDraft draft) {
    XSSFSheet sheet = workbook.getSheet(draft.name());
    draft.cells().forEach((at, content) -> put(sheet, at, content));
    sheet.setColumnWidth(0, 34 * 256);
  }

  private void put(XSSFSheet sheet, CellAt at, Content content) {
    if (content instanceof Content.Numeric number) {
      Cell cell = cell(sheet, at);
      cell.setCellValue(number.value());
      if (number.format() != null) {
        cell.setCellStyle(styles.computeIfAbsent(number.format(), this::style));
      }
    } else if (content instanceof Content.Label label) {
      cell(sheet, at).setCellValue(label.text());
    } else if (content instanceof Content.Formula formula) {
      cell(sheet, at).setCellFormula(formula.text());
    } else if (content instanceof Content.ArrayFormula array) {
      int lastRow = at.row() + array.rows() - 1;
      int lastColumn = at.column() + array.columns() - 1;
      sheet.setArrayFormula(
          array.text(), new CellRangeAddress(at.row(), lastRow, at.column(), lastColumn));
    }
  }

  private CellStyle style(String format) {
    CellStyle style = workbook.createCellStyle();
    style.setDataFormat(workbook.createDataFormat().getFormat(format));
    return style;
  }

  private static Cell cell(Sheet sheet, CellAt at) {
    Row row = sheet.getRow(at.row());
    return (row == null ? sheet.createRow(at.row()) : row).createCell(at.column());
  }

  private void table(Book.Table draft) {
    CellAt first = draft.first();
    CellReference end =
        new CellReference(first.row() + draft.rows(), first.column() + draft.headings().size() - 1);
    XSSFTable table =
        workbook
            .getSheet(first.sheet())
            .createTable(
                new AreaReference(
                    new CellReference(first.row(), first.column()),
                    end,
                    SpreadsheetVersion.EXCEL2007));
    table.setName(draft.name());
    table.setDisplayName(draft.name());
    table.getCTTable().addNewAutoFilter().setRef(table.getArea().formatAsString());
  }
}
