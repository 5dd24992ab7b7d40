package weighhouse.workbook;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.stream.Stream;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.ClientAnchor;
import org.apache.poi.ss.usermodel.Comment;
import org.apache.poi.ss.usermodel.Drawing;
import org.apache.poi.ss.usermodel.FormulaError;
import org.apache.poi.ss.usermodel.Name;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.usermodel.SheetVisibility;
import org.apache.poi.ss.usermodel.Workbook;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Workbooks for the checks of reading, written by POI. */
public final class SampleBooks {
  private SampleBooks() {}

  /** The formats that POI writes, with a file name for each. */
  public static Stream<String> fileNames() {
    return Stream.of("sample.xlsx", "sample.xls");
  }

  /** A small invented model with most of what a snapshot holds, evaluated. */
  public static byte[] sample(String fileName) throws IOException {
    try (Workbook book = fileName.endsWith(".xls") ? new HSSFWorkbook() : new XSSFWorkbook()) {
      Sheet inputs = book.createSheet("Inputs");
      inputs(book, inputs);
      Sheet trace = book.createSheet("Trace 1");
      name(book, "hr_prog", -1, "Inputs!$B$2");
      name(book, "start", 1, "'Trace 1'!$B$1");
      trace(trace);
      book.setSheetVisibility(
          book.getSheetIndex(book.createSheet("Lists")), SheetVisibility.VERY_HIDDEN);
      book.setSheetVisibility(
          book.getSheetIndex(book.createSheet("Notes")), SheetVisibility.HIDDEN);
      book.getCreationHelper().createFormulaEvaluator().evaluateAll();
      ByteArrayOutputStream out = new ByteArrayOutputStream();
      book.write(out);
      return out.toByteArray();
    }
  }

  private static void inputs(Workbook book, Sheet sheet) {
    row(sheet, 0, "Parameter", "Value", "Unit");
    row(sheet, 1, "Hazard ratio, progression", 0.7, "ratio");
    row(sheet, 2, "Probability of progression  ", 0.1234567890123456, "per month");
    row(sheet, 3, "Größe – ☃", -1.5e-300, "0.5");
    row(sheet, 4, "Switch", true, "");
    Cell error = sheet.createRow(5).createCell(1);
    error.setCellErrorValue(FormulaError.NA.getCode());
    CellStyle percent = book.createCellStyle();
    percent.setDataFormat(book.createDataFormat().getFormat("0.00%"));
    sheet.getRow(2).getCell(1).setCellStyle(percent);
    sheet.getRow(4).createCell(3).setCellStyle(percent);
    sheet.addMergedRegion(new CellRangeAddress(7, 8, 0, 2));
    sheet.setColumnHidden(3, true);
    sheet.getRow(3).setZeroHeight(true);
    Drawing<?> drawing = sheet.createDrawingPatriarch();
    ClientAnchor anchor = book.getCreationHelper().createClientAnchor();
    anchor.setCol2(4);
    anchor.setRow2(4);
    Comment comment = drawing.createCellComment(anchor);
    comment.setString(book.getCreationHelper().createRichTextString("From the trial"));
    comment.setAddress(1, 1);
  }

  private static void trace(Sheet sheet) {
    row(sheet, 0, "Cycle", 1.0);
    for (int r = 1; r <= 20; r++) {
      Row row = sheet.createRow(r);
      row.createCell(0).setCellValue(r);
      row.createCell(1).setCellFormula("B" + r + "*(1-Inputs!$B$3*hr_prog)");
      row.createCell(2).setCellFormula("IF(B" + (r + 1) + ">0.5,\"high\",\"\")");
    }
    sheet.setArrayFormula("A2:A4*2", new CellRangeAddress(1, 3, 4, 4));
    sheet.getRow(1).createCell(5).setCellFormula("1/0");
    sheet.getRow(2).createCell(5).setCellFormula("B2>B3");
  }

  private static void name(Workbook book, String text, int sheet, String formula) {
    Name name = book.createName();
    name.setNameName(text);
    name.setSheetIndex(sheet);
    name.setRefersToFormula(formula);
  }

  private static void row(Sheet sheet, int index, Object... values) {
    Row row = sheet.createRow(index);
    for (int c = 0; c < values.length; c++) {
      if (values[c] instanceof Double number) {
        row.createCell(c).setCellValue(number);
      } else if (values[c] instanceof Boolean flag) {
        row.createCell(c).setCellValue(flag);
      } else {
        row.createCell(c).setCellValue(String.valueOf(values[c]));
      }
    }
  }
}
