package weighhouse.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.FormulaError;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.WorkbookFactory;
import org.junit.jupiter.api.Test;
import weighhouse.workbook.file.WorkbookReader;

/** Cell by cell the same as POI's user model reads. */
class SameAsPoiTest {

  @Test
  void smallModelInBothFormats() throws Exception {
    for (String name : SampleBooks.fileNames().toList()) {
      compare(SampleBooks.sample(name), name);
    }
  }

  @Test
  void cohortsWithOwnAndSharedFormulas() throws Exception {
    compare(ReadingBenchmark.cohort(5000, false), "plain.xlsx");
    compare(ReadingBenchmark.cohort(5000, true), "shared.xlsx");
  }

  private static void compare(byte[] file, String name) throws Exception {
    Workbook ours = WorkbookReader.read(file, name);
    try (var theirs = WorkbookFactory.create(new ByteArrayInputStream(file))) {
      int compared = 0;
      for (int s = 0; s < theirs.getNumberOfSheets(); s++) {
        CellStore cells = ours.sheet(s).cells();
        int onSheet = 0;
        for (Row row : theirs.getSheetAt(s)) {
          for (Cell cell : row) {
            onSheet += compare(cells, cell) ? 1 : 0;
          }
        }
        assertEquals(onSheet, cells.size(), "no cell that POI does not see");
        compared += onSheet;
      }
      assertTrue(compared > 50, "something was compared");
    }
  }

  private static boolean compare(CellStore cells, Cell cell) {
    if (cell.getCellType() == CellType.BLANK) {
      return false;
    }
    int i = cells.find(cell.getRowIndex(), cell.getColumnIndex());
    String where = cell.getAddress().formatAsString();
    assertTrue(i >= 0, where);
    assertEquals(cell.getCellStyle().getDataFormatString(), cells.numberFormat(i), where);
    boolean formula = cell.getCellType() == CellType.FORMULA;
    boolean own = cells.anchorRow(i) == cells.row(i) && cells.role(i) != FormulaRole.ARRAY_MEMBER;
    if (formula && own) {
      assertEquals(cell.getCellFormula(), cells.formula(i), where);
    }
    assertEquals(formula || cells.role(i) == FormulaRole.ARRAY_MEMBER, cells.hasFormula(i), where);
    compareValue(formula ? cell.getCachedFormulaResultType() : cell.getCellType(), cell, cells, i);
    return true;
  }

  private static void compareValue(CellType type, Cell cell, CellStore cells, int i) {
    switch (type) {
      case NUMERIC -> assertEquals(cell.getNumericCellValue(), cells.number(i));
      case STRING -> assertEquals(cell.getStringCellValue(), cells.text(i));
      case BOOLEAN -> assertEquals(cell.getBooleanCellValue() ? 1 : 0, cells.number(i));
      case ERROR ->
          assertEquals(FormulaError.forInt(cell.getErrorCellValue()).getString(), cells.text(i));
      default -> throw new AssertionError(type);
    }
  }
}
