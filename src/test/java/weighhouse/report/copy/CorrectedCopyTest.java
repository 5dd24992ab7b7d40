package weighhouse.report.copy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.usermodel.Workbook;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Figure;
import weighhouse.report.Samples;
import weighhouse.report.copy.edit.EditMaker;
import weighhouse.report.copy.edit.Edits;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.file.WorkbookReader;

class CorrectedCopyTest {
  private static final String CORRECT = "=1-(1-A2)^$A$1";

  private static AuditResult audit(byte[] file, CellRange cells, String suggested)
      throws Exception {
    return Samples.with(WorkbookReader.read(file, "model.xlsm"), cells, suggested);
  }

  private static byte[] copy(byte[] file, Edits edits) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    CorrectedCopy.write(file, edits, out);
    return out.toByteArray();
  }

  private static byte[] corrected(CellRange cells) throws Exception {
    byte[] file = SmallPackage.xlsm();
    return copy(file, EditMaker.make(audit(file, cells, CORRECT), Set.of(), false, Map.of()));
  }

  @Test
  void partsThatNeedNoChangeKeepTheirBytes() throws Exception {
    Map<String, String> before = SmallPackage.parts();
    Map<String, String> after = SmallPackage.unzip(corrected(new CellRange(0, 1, 1, 2, 1)));
    Set<String> changed = new TreeSet<>(before.keySet());
    changed.removeIf(name -> before.get(name).equals(after.get(name)));
    assertEquals(
        Set.of(
            "[Content_Types].xml",
            "xl/_rels/workbook.xml.rels",
            "xl/comments1.xml",
            "xl/workbook.xml",
            "xl/worksheets/_rels/sheet1.xml.rels",
            "xl/worksheets/sheet1.xml"),
        changed);
    Set<String> added = new TreeSet<>(after.keySet());
    added.removeAll(before.keySet());
    assertEquals(
        Set.of("xl/drawings/vmlDrawingWeighhouse1.vml", "xl/worksheets/weighhouse1.xml"), added);
  }

  @Test
  void firstHeirTakesASharedFormulaOver() throws Exception {
    byte[] copy = corrected(new CellRange(0, 1, 1, 2, 1));
    try (Workbook workbook = new XSSFWorkbook(new ByteArrayInputStream(copy))) {
      Sheet sheet = workbook.getSheetAt(0);
      assertEquals(
          List.of("1-(1-A2)^$A$1", "1-(1-A3)^$A$1", "A4*$A$1", "A5*$A$1", "A6*$A$1"),
          List.of(1, 2, 3, 4, 5).stream()
              .map(row -> sheet.getRow(row).getCell(1).getCellFormula())
              .toList());
    }
    String sheet = SmallPackage.unzip(copy).get("xl/worksheets/sheet1.xml");
    assertTrue(
        sheet.contains("<c r=\"B4\"><f t=\"shared\" ref=\"B4:B6\" si=\"0\">A4*$A$1</f>"), sheet);
    assertTrue(sheet.contains("<!-- kept -->"));
  }

  @Test
  void cellsThatDoNotChangeKeepTheirText() throws Exception {
    String before = SmallPackage.parts().get("xl/worksheets/sheet1.xml");
    String after =
        SmallPackage.unzip(corrected(new CellRange(0, 3, 1, 3, 1))).get("xl/worksheets/sheet1.xml");
    String shared = "<c r=\"B4\"><f t=\"shared\" si=\"0\"/><v>0.21</v></c>";
    assertTrue(before.contains(shared), before);
    String expected = before.replace(shared, "<c r=\"B4\"><f>1-(1-A2)^$A$1</f></c>");
    assertEquals(expected, after.replaceFirst("<legacyDrawing [^>]*>", ""));
  }

  @Test
  void memberOfAnArrayFormulaIsLeft() throws Exception {
    byte[] file = SmallPackage.xlsm();
    AuditResult audit = audit(file, new CellRange(0, 1, 3, 3, 3), "=1-(1-A2:A4)^A1");
    Edits edits = EditMaker.make(audit, Set.of(), false, Map.of());
    Set<CellAddress> written = CorrectedCopy.write(file, edits, new ByteArrayOutputStream());
    assertEquals(Set.of(new CellAddress(0, 1, 3)), written);
    String sheet = SmallPackage.unzip(copy(file, edits)).get("xl/worksheets/sheet1.xml");
    assertTrue(sheet.contains("<f t=\"array\" ref=\"D2:D4\">1-(1-A2:A4)^A1</f>"), sheet);
    assertTrue(sheet.contains("<c r=\"D3\"><v>0.13999999999999999</v></c>"), sheet);
  }

  @Test
  void commentTellsTheOldFormulaAndKeepsWhatWasSaid() throws Exception {
    try (Workbook workbook =
        new XSSFWorkbook(new ByteArrayInputStream(corrected(new CellRange(0, 1, 1, 2, 1))))) {
      Sheet sheet = workbook.getSheetAt(0);
      String first = sheet.getRow(1).getCell(1).getCellComment().getString().getString();
      assertTrue(first.contains("Was: =A2*$A$1"), first);
      String second = sheet.getRow(2).getCell(1).getCellComment().getString().getString();
      assertTrue(second.startsWith("checked"), second);
      assertTrue(second.contains("Was: =A3*$A$1"), second);
      Sheet review = workbook.getSheet(Edits.REVIEW_SHEET);
      assertEquals("'Model & co'!B2:B3", review.getRow(2).getCell(1).getHyperlink().getAddress());
    }
  }

  @Test
  void storedValuesFollowWhereTheyAreKnown() throws Exception {
    byte[] file = SmallPackage.xlsm();
    AuditResult audit = audit(file, new CellRange(0, 1, 1, 1, 1), CORRECT);
    Map<CellAddress, Figure> values =
        Map.of(
            new CellAddress(0, 1, 1), Figure.of(0.0711),
            new CellAddress(0, 4, 1), new Figure(Double.NaN, "#NUM!"),
            new CellAddress(0, 0, 0), Figure.of(9));
    String sheet =
        SmallPackage.unzip(copy(file, EditMaker.make(audit, Set.of(), false, values)))
            .get("xl/worksheets/sheet1.xml");
    assertTrue(sheet.contains("<c r=\"B2\" s=\"0\"><f>1-(1-A2)^$A$1</f><v>0.0711</v></c>"), sheet);
    assertTrue(
        sheet.contains("<c r=\"B5\" t=\"e\"><f t=\"shared\" si=\"0\"/><v>#NUM!</v></c>"), sheet);
    assertTrue(sheet.contains("<c r=\"A1\"><v>0.7</v></c>"), "a typed value is never replaced");
  }

  @Test
  void commentsOnlyLeavesTheSheetsFormulas() throws Exception {
    byte[] file = SmallPackage.xlsm();
    AuditResult audit = audit(file, new CellRange(0, 1, 1, 2, 1), CORRECT);
    Map<String, String> after =
        SmallPackage.unzip(copy(file, EditMaker.make(audit, Set.of(), true, Map.of())));
    assertEquals(
        SmallPackage.parts().get("xl/worksheets/sheet1.xml"),
        after.get("xl/worksheets/sheet1.xml").replaceFirst("<legacyDrawing [^>]*>", ""));
    assertFalse(after.get("xl/workbook.xml").contains("fullCalcOnLoad"));
    assertTrue(after.get("xl/comments1.xml").contains("Suggested: =1-(1-A2)^$A$1"));
  }

  @Test
  void typedValueBecomesAFormula() throws Exception {
    byte[] file = SmallPackage.xlsm();
    AuditResult audit = audit(file, new CellRange(0, 1, 0, 1, 0), "=A1/7");
    Map<String, String> after =
        SmallPackage.unzip(copy(file, EditMaker.make(audit, Set.of(), false, Map.of())));
    assertTrue(after.get("xl/worksheets/sheet1.xml").contains("<c r=\"A2\"><f>A1/7</f></c>"));
    assertFalse(after.containsKey("xl/calcChain.xml"), "its order would be wrong");
    assertFalse(after.get("[Content_Types].xml").contains("calcChain"));
    assertTrue(
        after.get("xl/workbook.xml").contains("<calcPr calcId=\"1\" fullCalcOnLoad=\"1\"/>"));
  }

  @Test
  void oldBinaryWorkbooksAreCorrectedToo() throws Exception {
    byte[] file;
    try (HSSFWorkbook workbook = new HSSFWorkbook();
        ByteArrayOutputStream out = new ByteArrayOutputStream()) {
      Row row = workbook.createSheet("Model").createRow(0);
      row.createCell(0).setCellValue(2);
      row.createCell(1).setCellFormula("A1*3");
      workbook.write(out);
      file = out.toByteArray();
    }
    AuditResult audit = audit(file, new CellRange(0, 0, 1, 0, 1), "=-A1^2");
    byte[] copy = copy(file, EditMaker.make(audit, Set.of(), false, Map.of()));
    try (HSSFWorkbook workbook = new HSSFWorkbook(new ByteArrayInputStream(copy))) {
      Cell cell = workbook.getSheetAt(0).getRow(0).getCell(1);
      assertEquals("(-A1)^2", cell.getCellFormula(), "the sign binds first, as in Excel");
      assertTrue(cell.getCellComment().getString().getString().contains("Was: =A1*3"));
      assertTrue(workbook.getSheet(Edits.REVIEW_SHEET) != null);
    }
  }
}
