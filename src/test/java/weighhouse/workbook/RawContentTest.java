package weighhouse.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Content as other programs write it, element by element (ECMA-376 part 1, section 18.3). */
class RawContentTest {

  private static CellStore cells(String rows) throws Exception {
    return RawBook.ofCells(rows).read().sheet(0).cells();
  }

  @Test
  void sharedFormulasGiveTheTextOfTheirFirstCell() throws Exception {
    CellStore cells =
        cells(
            "<row r='2'><c r='B2'><f t='shared' ref='B2:B4' si='0'>A2*2</f><v>1</v></c></row>"
                + "<row r='3'><c r='B3'><f t='shared' si='0'/><v>2</v></c></row>"
                + "<row r='4'><c r='B4'><f t='shared' si='0'>A4*2</f><v>3</v></c></row>");
    int member = cells.find(2, 1);
    assertEquals("A2*2", cells.formula(member));
    assertEquals(1, cells.anchorRow(member));
    assertEquals(1, cells.anchorColumn(member));
    assertEquals(FormulaRole.PLAIN, cells.role(member));
    assertEquals("A4*2", cells.formula(cells.find(3, 1)), "a member's own text is its own");
    assertEquals(3, cells.anchorRow(cells.find(3, 1)));
  }

  @Test
  void groupNumberUsedAgainStartsAnotherGroup() throws Exception {
    CellStore cells =
        cells(
            "<row><c><f t='shared' ref='A1:A2' si='0'>C1</f></c></row>"
                + "<row><c><f t='shared' si='0'/></c></row>"
                + "<row><c><f t='shared' ref='A3:A4' si='0'>D3</f></c></row>"
                + "<row><c><f t='shared' si='0'/></c></row>");
    assertEquals("C1", cells.formula(cells.find(1, 0)));
    assertEquals("D3", cells.formula(cells.find(3, 0)));
  }

  @Test
  void sharedFormulaWithoutTextIsCountedAndKeepsItsValue() throws Exception {
    Workbook book =
        RawBook.ofCells(
                "<row><c><f t='shared' si='4'/><v>7</v></c><c><f t='shared' si='4'/></c></row>")
            .read();
    CellStore cells = book.sheet(0).cells();
    assertEquals(7, cells.number(cells.find(0, 0)));
    assertEquals(FormulaRole.NONE, cells.role(cells.find(0, 0)));
    assertEquals(
        List.of("Sheet S: 2 cells share a formula whose text is missing."), book.problems());
  }

  @Test
  void membersMayComeBeforeTheTextOfTheirGroup() throws Exception {
    CellStore cells =
        cells(
            "<row r='5'><c r='A5'><f t='shared' si='0'/></c></row>"
                + "<row r='2'><c r='A2'><f t='shared' ref='A2:A5' si='0'>B2</f></c></row>");
    assertEquals("B2", cells.formula(cells.find(4, 0)));
    assertEquals(1, cells.anchorRow(cells.find(4, 0)));
    assertEquals(0, cells.find(1, 0), "stored in the order of rows");
  }

  @Test
  void dynamicArraysAndWhatTheySpill() throws Exception {
    CellStore cells =
        cells(
            "<row><c r='A1' cm='1'><f t='array' ref='A1:B1'>_xlfn.SEQUENCE(1,2)</f><v>1</v></c>"
                + "<c r='B1'><v>2</v></c><c r='C1'><v>3</v></c></row>");
    assertEquals(FormulaRole.DYNAMIC_ARRAY, cells.role(0));
    assertEquals(FormulaRole.ARRAY_MEMBER, cells.role(1));
    assertEquals("_xlfn.SEQUENCE(1,2)", cells.formula(1));
    assertEquals(FormulaRole.NONE, cells.role(2));
  }

  @Test
  void dataTablesAreNoConstants() throws Exception {
    CellStore cells =
        cells(
            "<row><c><f t='dataTable' ref='A1:B2' dt2D='1' dtr='1' r1='D1' r2='D2'/><v>1</v></c>"
                + "<c><v>2</v></c></row><row><c><v>3</v></c><c><v>4</v></c><c><v>5</v></c></row>");
    for (int i = 0; i < 4; i++) {
      assertEquals(FormulaRole.DATA_TABLE, cells.role(i));
      assertNull(cells.formula(i));
    }
    assertEquals(4, cells.number(cells.find(1, 1)));
    assertEquals(FormulaRole.NONE, cells.role(cells.find(1, 2)));
  }

  @Test
  void everyWayToWriteAValue() throws Exception {
    CellStore cells =
        cells(
            "<row><c t='inlineStr'><is><r><t xml:space='preserve'> a</t></r><rPh><t>x</t></rPh>"
                + "<r><t>b </t></r></is></c><c t='str'><f>A1</f><v></v></c><c t='b'><v>1</v></c>"
                + "<c t='e'><v>#N/A</v></c><c t='n'><v>1E-3</v></c><c><v> 12 </v></c>"
                + "<c t='d'><v>2024-02-29T12:00:00</v></c><c><f>B1</f></c><c t='str'><v>1_x000A_2</v></c>"
                + "</row>");
    assertEquals(" ab ", cells.text(0));
    assertEquals("", cells.text(1));
    assertEquals(CellKind.TEXT, cells.kind(1));
    assertEquals(CellKind.BOOLEAN, cells.kind(2));
    assertEquals("#N/A", cells.text(3));
    assertEquals(0.001, cells.number(4));
    assertEquals(12, cells.number(5));
    assertEquals(45351.5, cells.number(6), "Excel's own number of that moment");
    assertEquals(CellKind.BLANK, cells.kind(7), "a formula without a stored value");
    assertEquals("B1", cells.formula(7));
    assertEquals("1\n2", cells.text(8));
  }

  @Test
  void laterOfTwoEntriesForOneCellStays() throws Exception {
    CellStore cells =
        cells(
            "<row r='1'><c r='A1'><v>1</v></c><c r='B1'><v>2</v></c><c r='A1'><v>3</v></c></row>");
    assertEquals(2, cells.size());
    assertEquals(3, cells.number(cells.find(0, 0)));
  }

  @Test
  void unreadableNumbersAreCounted() throws Exception {
    Workbook book = RawBook.ofCells("<row><c><v>1.2.3</v></c><c t='s'><v>9</v></c></row>").read();
    assertEquals(List.of("Sheet S: the stored values of 2 cells cannot be read."), book.problems());
    assertEquals(0, book.sheet(0).cells().size());
  }

  @Test
  void strictFilesReadAlike() throws Exception {
    String strict = "http://purl.oclc.org/ooxml/";
    RawBook book = RawBook.ofCells("");
    book.part(
        "_rels/.rels",
        "<Relationships xmlns='http://schemas.openxmlformats.org/package/2006/relationships'>"
            + "<Relationship Id='a' Type='"
            + strict
            + "officeDocument/relationships/officeDocument' Target='/xl/workbook.xml'/>"
            + "</Relationships>");
    book.part(
        "xl/worksheets/sheet1.xml",
        "<x:worksheet xmlns:x='"
            + strict
            + "spreadsheetml/main'><x:sheetData><x:row><x:c t='d'><x:v>1900-02-28</x:v></x:c>"
            + "</x:row></x:sheetData></x:worksheet>");
    assertEquals(59, book.read().sheet(0).cells().number(0));
  }

  @Test
  void datesOf1904() throws Exception {
    RawBook book = RawBook.ofCells("<row><c t='d'><v>1904-01-02</v></c></row>");
    book.main("<workbookPr date1904='1'/><sheets><sheet name='S' sheetId='1' r:id='r1'/></sheets>");
    assertTrue(book.read().date1904());
    assertEquals(1, book.read().sheet(0).cells().number(0));
  }

  @Test
  void namesKeepTheirScopeBesideChartSheets() throws Exception {
    RawBook book = RawBook.ofCells("");
    book.relation("r0", "chartsheet", "chartsheets/sheet1.xml");
    book.main(
        "<sheets><sheet name='Chart' sheetId='2' r:id='r0'/><sheet name='S' sheetId='1'"
            + " r:id='r1'/></sheets><definedNames><definedName name='hr' localSheetId='1'"
            + " hidden='1' comment='of progression'>S!$A$1</definedName>"
            + "<definedName name='_xlnm.Print_Area' localSheetId='1'>S!$A$1</definedName>"
            + "</definedNames>");
    assertEquals(
        List.of(new DefinedName("hr", 0, "S!$A$1", true, "of progression")), book.read().names());
  }

  @Test
  void macrosAndExternalLinks() throws Exception {
    RawBook book = RawBook.ofCells("");
    book.contentType("application/vnd.ms-excel.sheet.macroEnabled.main+xml");
    book.relation("r7", "vbaProject", "vbaProject.bin");
    book.relation("r8", "externalLink", "externalLinks/externalLink1.xml");
    book.main(
        "<sheets><sheet name='S' sheetId='1' r:id='r1'/></sheets>"
            + "<externalReferences><externalReference r:id='r8'/></externalReferences>");
    book.part(
        "xl/externalLinks/_rels/externalLink1.xml.rels",
        "<Relationships><Relationship Id='a' Type='x/externalLinkPath'"
            + " Target='file:///C:/other%20model.xlsx' TargetMode='External'/></Relationships>");
    Workbook read = book.read();
    assertEquals(List.of("xl/vbaProject.bin"), read.macros());
    assertEquals(List.of("file:///C:/other%20model.xlsx"), read.externalLinks());
  }

  @Test
  void tablesAndThreadedComments() throws Exception {
    RawBook book = RawBook.ofCells("<row><c t='str'><v>HR</v></c></row>");
    String types = "http://schemas.openxmlformats.org/officeDocument/2006/relationships/";
    book.part(
        "xl/worksheets/_rels/sheet1.xml.rels",
        ("<Relationships><Relationship Id='a' Type='%stable' Target='../tables/table1.xml'/>"
                + "<Relationship Id='b' Type='%scomments' Target='../comments1.xml'/>"
                + "<Relationship Id='c' Type='x/threadedComment' Target='../t/t1.xml'/>"
                + "</Relationships>")
            .formatted(types, types));
    book.part(
        "xl/tables/table1.xml",
        "<table name='t' displayName='Inputs' ref='A1:B9' totalsRowCount='1'><tableColumns>"
            + "<tableColumn id='1' name='HR'/><tableColumn id='2' name='a_x000a_b'/>"
            + "</tableColumns></table>");
    book.part(
        "xl/comments1.xml",
        "<comments><commentList><comment ref='A1'><text><t>[Threaded comment] see there</t></text>"
            + "</comment><comment ref='B2'><text><r><t>a </t></r><r><t>note</t></r></text>"
            + "</comment></commentList></comments>");
    book.part(
        "xl/t/t1.xml",
        "<ThreadedComments><threadedComment ref='A1'><text>Which trial?</text></threadedComment>"
            + "<threadedComment ref='A1'><text>The second.</text></threadedComment>"
            + "</ThreadedComments>");
    Sheet sheet = book.read().sheet(0);
    assertEquals(
        List.of(new Table("Inputs", new CellRange(0, 0, 0, 8, 1), 1, 1, List.of("HR", "a\nb"))),
        sheet.tables());
    assertEquals("Which trial?\nThe second.", sheet.comments().get(new CellAddress(0, 0, 0)));
    assertEquals("a note", sheet.comments().get(new CellAddress(0, 1, 1)));
  }
}
