package weighhouse.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import weighhouse.workbook.file.WorkbookReader;

/** What the snapshot holds of a workbook, the same from either format. */
class WorkbookReaderTest {

  private static Workbook read(String fileName) throws Exception {
    return WorkbookReader.read(SampleBooks.sample(fileName), fileName);
  }

  @ParameterizedTest
  @MethodSource("weighhouse.workbook.SampleBooks#fileNames")
  void valuesAndFormats(String fileName) throws Exception {
    Workbook book = read(fileName);
    CellStore cells = book.sheet(0).cells();
    assertEquals(List.of(), book.problems());
    assertEquals("Probability of progression  ", cells.text(cells.find(2, 0)));
    assertEquals(0.1234567890123456, cells.number(cells.find(2, 1)));
    assertEquals("0.00%", cells.numberFormat(cells.find(2, 1)));
    assertEquals("General", cells.numberFormat(cells.find(1, 1)));
    assertEquals("Größe – ☃", cells.text(cells.find(3, 0)));
    assertEquals(-1.5e-300, cells.number(cells.find(3, 1)));
    assertEquals(CellKind.TEXT, cells.kind(cells.find(3, 2)), "a number as text stays text");
    assertEquals(CellKind.BOOLEAN, cells.kind(cells.find(4, 1)));
    assertEquals(1, cells.number(cells.find(4, 1)));
    assertEquals("#N/A", cells.text(cells.find(5, 1)));
    assertTrue(cells.find(4, 3) < 0, "a blank styled cell is not stored");
    assertTrue(cells.find(100, 3) < 0);
    assertEquals(6, cells.rows());
    assertEquals(3, cells.columns());
  }

  @ParameterizedTest
  @MethodSource("weighhouse.workbook.SampleBooks#fileNames")
  void formulasAndTheirResults(String fileName) throws Exception {
    CellStore cells = read(fileName).sheet(1).cells();
    int last = cells.find(20, 1);
    assertEquals("B20*(1-Inputs!$B$3*hr_prog)", cells.formula(last));
    assertEquals(FormulaRole.PLAIN, cells.role(last));
    assertEquals(20, cells.anchorRow(last));
    assertEquals(Math.pow(1 - 0.1234567890123456 * 0.7, 20), cells.number(last), 1e-12);
    assertEquals("high", cells.text(cells.find(1, 2)));
    assertEquals("", cells.text(cells.find(20, 2)));
    assertEquals("#DIV/0!", cells.text(cells.find(1, 5)));
    assertEquals(CellKind.BOOLEAN, cells.kind(cells.find(2, 5)));
    assertNull(cells.formula(cells.find(0, 0)));
  }

  @ParameterizedTest
  @MethodSource("weighhouse.workbook.SampleBooks#fileNames")
  void arrayFormulas(String fileName) throws Exception {
    Sheet sheet = read(fileName).sheet(1);
    CellStore cells = sheet.cells();
    assertEquals(List.of(new CellRange(1, 1, 4, 3, 4)), sheet.arrays());
    assertEquals(FormulaRole.ARRAY_ANCHOR, cells.role(cells.find(1, 4)));
    int member = cells.find(3, 4);
    assertEquals(FormulaRole.ARRAY_MEMBER, cells.role(member));
    assertEquals("A2:A4*2", cells.formula(member));
    assertEquals(1, cells.anchorRow(member));
    assertEquals(4, cells.anchorColumn(member));
  }

  @ParameterizedTest
  @MethodSource("weighhouse.workbook.SampleBooks#fileNames")
  void namesAndWhatIsHidden(String fileName) throws Exception {
    Workbook book = read(fileName);
    assertEquals(
        List.of(
            new DefinedName("hr_prog", DefinedName.WORKBOOK_SCOPE, "Inputs!$B$2", false, ""),
            new DefinedName("start", 1, "'Trace 1'!$B$1", false, "")),
        book.names());
    assertEquals(
        List.of(Visibility.VISIBLE, Visibility.VISIBLE, Visibility.VERY_HIDDEN, Visibility.HIDDEN),
        book.sheets().stream().map(Sheet::visibility).toList());
    Sheet inputs = book.sheet(0);
    assertEquals("From the trial", inputs.comments().get(new CellAddress(0, 1, 1)));
    assertEquals(List.of(new CellRange(0, 7, 0, 8, 2)), inputs.merged());
    assertEquals("{3}", inputs.hiddenRows().toString());
    assertEquals("{3}", inputs.hiddenColumns().toString());
  }
}
