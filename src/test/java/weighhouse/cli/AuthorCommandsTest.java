package weighhouse.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import weighhouse.report.Samples;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.file.WorkbookReader;

/** The commands whose files go back to the author: correct, draft, compare, and briefs. */
class AuthorCommandsTest {
  @TempDir private Path folder;
  private final Terminal terminal =
      new Terminal(
          file ->
              Samples.with(WorkbookReader.read(file), new CellRange(0, 0, 1, 0, 1), "=1-(1-A1)^2"));
  private Path model;
  private byte[] bytes;

  @BeforeEach
  void makeModel() throws Exception {
    try (XSSFWorkbook workbook = new XSSFWorkbook();
        ByteArrayOutputStream out = new ByteArrayOutputStream()) {
      Row row = workbook.createSheet("Model").createRow(0);
      row.createCell(0).setCellValue(0.1);
      row.createCell(1).setCellFormula("A1*2");
      workbook.write(out);
      bytes = out.toByteArray();
    }
    model = Files.write(folder.resolve("model.xlsx"), bytes);
  }

  @Test
  void correctLeavesTheWorkbookAlone() throws Exception {
    Path copy = folder.resolve("copy.xlsx");
    assertEquals(0, terminal.run("correct", model.toString(), "--out", copy.toString()));
    assertArrayEquals(bytes, Files.readAllBytes(model));
    try (XSSFWorkbook workbook = new XSSFWorkbook(Files.newInputStream(copy))) {
      assertEquals("1-(1-A1)^2", workbook.getSheetAt(0).getRow(0).getCell(1).getCellFormula());
    }
    assertTrue(terminal.out.toString().startsWith("1 formulas corrected"));
  }

  @Test
  void correctNeverWritesOverTheWorkbook() throws Exception {
    assertEquals(2, terminal.run("correct", model.toString(), "--out", model.toString()));
    assertArrayEquals(bytes, Files.readAllBytes(model));
  }

  @Test
  void correctRefusesAnUnknownFinding() {
    Path copy = folder.resolve("copy.xlsx");
    assertEquals(
        2, terminal.run("correct", model.toString(), "--out", copy.toString(), "--only", "zz"));
    assertFalse(Files.exists(copy));
    assertTrue(terminal.err.toString().contains("No finding has the id zz"));
  }

  @Test
  void draftIsNotReplacedUnasked() {
    String brief = folder.resolve("brief.yaml").toString();
    assertEquals(0, terminal.run("draft", model.toString(), "--out", brief));
    assertEquals(2, terminal.run("draft", model.toString(), "--out", brief));
    assertEquals(0, terminal.run("draft", model.toString(), "--out", brief, "--force"));
    assertEquals(
        0, terminal.run("gate", model.toString(), "--brief", brief, "--hold-at", "critical"));
  }

  @Test
  void faultsOfABriefComeWithTheirPlaces() throws Exception {
    Path brief = Files.writeString(folder.resolve("b.yaml"), "cycle: soon\ngate: [x]\n");
    assertEquals(2, terminal.run("gate", model.toString(), "--brief", brief.toString()));
    String said = terminal.err.toString();
    assertTrue(said.contains("b.yaml:1:8: cycle"), said);
    assertTrue(said.contains("b.yaml:2:7: gate"), said);
  }

  @Test
  void gateIsIncompleteBelowTheDemand() throws Exception {
    Path brief = Files.writeString(folder.resolve("b.yaml"), "gate: { least-coverage: 1 }");
    String[] gate = {"gate", model.toString(), "--brief", brief.toString()};
    assertEquals(3, terminal.run(gate), () -> terminal.out.toString() + terminal.err);
    assertTrue(terminal.out.toString().contains("Only 99.6 % of the formula cells"));
    assertEquals(
        3,
        terminal.run(
            "audit", model.toString(), "--brief", brief.toString(), "--out", folder.toString()));
  }

  @Test
  void compareWritesBothPages() {
    assertEquals(
        0, terminal.run("compare", model.toString(), model.toString(), "--out", folder.toString()));
    assertTrue(Files.exists(folder.resolve("model.xlsx.compared.html")));
    assertTrue(Files.exists(folder.resolve("model.xlsx.compared.json")));
    assertTrue(terminal.out.toString().startsWith("0 findings resolved, 0 new, 1 still there."));
  }
}
