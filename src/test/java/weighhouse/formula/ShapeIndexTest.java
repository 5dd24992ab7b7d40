package weighhouse.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import weighhouse.workbook.Workbook;

class ShapeIndexTest {

  @Test
  void filledFormulasAreOneShapeAndOneRegion() {
    FormulaGrid grid = new FormulaGrid().sheet("Trace").formula("A1", "=B$1");
    for (int row = 2; row <= 9; row++) {
      for (String column : List.of("C", "D", "E")) {
        char left = (char) (column.charAt(0) - 1);
        grid.formula(column + row, left + "" + row + "*$A$1+\"A1\"&SUM($1:$1,$A:$A)*'A1'!$B" + row);
      }
    }
    Workbook workbook = grid.build();
    Shapes shapes = ShapeIndex.of(workbook);
    assertEquals(List.of("Trace!A1", "Trace!C2:E9"), ranges(workbook, shapes).subList(0, 2));
  }

  @Test
  void aColumnOfColumnReferencesStaysOneShape() {
    FormulaGrid grid = new FormulaGrid().sheet("S");
    for (int row = 1; row <= 4; row++) {
      grid.formula("C" + row, "SUM(A:B)/p*HR1x-1").formula("D" + row, "SUM(B:C)/p*HR1x-1");
    }
    Workbook workbook = grid.build();
    assertEquals(List.of("S!C1:D4"), ranges(workbook, ShapeIndex.of(workbook)));
  }

  @Test
  void oddOneOutSplitsTheColumn() {
    FormulaGrid grid = new FormulaGrid().sheet("S");
    for (int row = 1; row <= 5; row++) {
      grid.formula("B" + row, row == 3 ? "A3*2" : "A" + row + "*3");
    }
    Workbook workbook = grid.build();
    Shapes shapes = ShapeIndex.of(workbook);
    assertEquals(List.of("S!B1:B2", "S!B3", "S!B4:B5"), ranges(workbook, shapes));
    assertEquals(2, shapes.all().size());
    assertSame(shapes.at(FormulaGrid.cell(0, "B1")), shapes.at(FormulaGrid.cell(0, "B5")));
    assertEquals(2, shapes.regionAt(FormulaGrid.cell(0, "B5")).id());
    assertNull(shapes.at(FormulaGrid.cell(0, "A1")));
  }

  @Test
  void sharedFormulasTakeTheirAnchorsShape() {
    Workbook workbook =
        new FormulaGrid()
            .sheet("S")
            .formula("B1", "A1*Other!C1")
            .shared("B2", "B1", "A1*Other!C1")
            .formula("B3", "A3*Other!C3")
            .sheet("Other")
            .formula("B7", "A7*Other!C7")
            .build();
    Shapes shapes = ShapeIndex.of(workbook);
    assertEquals(1, shapes.all().size());
    assertEquals(List.of("S!B1:B3", "Other!B7"), ranges(workbook, shapes));
    assertEquals(0, shapes.shapeOf(0, 1));
  }

  @Test
  void arrayFormulasAreRegionsOfTheirOwn() {
    Workbook workbook =
        new FormulaGrid()
            .sheet("S")
            .array("B2", "D2", "MMULT(B1:D1,$F$1:$H$3)")
            .array("B3", "D3", "MMULT(B2:D2,$F$1:$H$3)")
            .formula("E3", "SUM(B3:D3)")
            .build();
    Shapes shapes = ShapeIndex.of(workbook);
    assertEquals(List.of("S!B2:D2", "S!B3:D3", "S!E3"), ranges(workbook, shapes));
    assertTrue(shapes.at(FormulaGrid.cell(0, "C3")).array());
    assertEquals(2, shapes.all().size());
  }

  @Test
  void cellsThatCannotBeParsedAreCountedWithTheReason() {
    Workbook workbook =
        new FormulaGrid().sheet("S").formula("A1", "1+").formula("A2", "1+").build();
    Shapes shapes = ShapeIndex.of(workbook);
    assertEquals(
        Map.of(
            FormulaGrid.cell(0, "A1"), "the formula ends too early at character 3",
            FormulaGrid.cell(0, "A2"), "the formula ends too early at character 3"),
        shapes.unparsed());
    assertEquals(List.of(), shapes.all());
    assertEquals(-1, shapes.shapeOf(0, 0));
  }

  @Test
  void lookalikesAreNotMistakenForReferences() {
    assertSameKey("Tab1[A1]*B1", 0, 2, "Tab1[A1]*C1", 0, 3);
    assertNotEquals(key("Tab1[A1]", 0, 2), key("Tab1[B1]", 0, 3));
    assertNotEquals(key("LOG10(A1)", 0, 2), key("LOG11(B1)", 0, 3));
    assertNotEquals(key("\"A1\"", 0, 0), key("\"A2\"", 1, 0));
    assertNotEquals(key("'A1'!B1", 0, 0), key("'A2'!B2", 1, 0));
    assertNotEquals(key("A : B", 0, 3), key("A : B", 0, 4));
    assertNotEquals(key("A1", 0, 0), key("$A$1", 0, 0));
    assertNotEquals(key("A1", 0, 0), key("A$1", 0, 0));
    assertSameKey("SUM(Jan:Dec!A1)", 0, 0, "SUM(Jan:Dec!B2)", 1, 1);
    assertSameKey("p*hr-1", 0, 0, "p*hr-1", 7, 7);
    assertSameKey("SUM($A1:B$7,1:2)", 0, 0, "SUM($A2:C$7,2:3)", 1, 1);
  }

  private static void assertSameKey(String a, int row, int column, String b, int r, int c) {
    assertEquals(key(a, row, column), key(b, r, c));
  }

  static String key(String text, int row, int column) {
    RelativeKey key = new RelativeKey();
    key.write(text, row, column, false);
    return new String(key.chars(), 0, key.length());
  }

  private static List<String> ranges(Workbook workbook, Shapes shapes) {
    return shapes.regions().stream().map(region -> workbook.show(region.range())).toList();
  }
}
