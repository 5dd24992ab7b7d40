package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import javax.xml.stream.XMLStreamException;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.CellsBuilder;

/**
 * What a worksheet's own part holds; comments and tables have parts of theirs.
 *
 * @param problems what could not be read, one sentence each
 */
record SheetPart(
    CellStore cells,
    List<CellRange> arrays,
    List<CellRange> merged,
    BitSet hiddenRows,
    BitSet hiddenColumns,
    List<String> problems) {

  /** What all sheets of a workbook refer to. */
  record Context(List<String> texts, List<String> formats, boolean date1904) {}

  /** Reads the part of the sheet of that index and name. */
  static SheetPart read(XmlPart xml, Context context, int sheet, String name) throws IOException {
    return new Reader(xml, context, sheet, name).read();
  }

  private static final class Reader {
    private final XmlPart xml;
    private final int sheet;
    private final String name;
    private final CellsBuilder cells;
    private final SheetFormulas formulas;
    private final CellValues values;
    private final CellsParser parser;
    private final List<CellRange> merged = new ArrayList<>();
    private final BitSet hiddenColumns = new BitSet();

    Reader(XmlPart xml, Context context, int sheet, String name) {
      this.xml = xml;
      this.sheet = sheet;
      this.name = name;
      cells = new CellsBuilder(context.texts(), context.formats());
      formulas = new SheetFormulas(xml.reader(), cells, sheet);
      values = new CellValues(xml, cells, context.texts().size(), context.date1904());
      parser = new CellsParser(xml.reader(), cells, formulas, values);
    }

    SheetPart read() throws IOException {
      while (xml.nextElement()) {
        switch (xml.element()) {
          case "sheetData" -> readCells();
          case "col" -> hideColumns();
          case "mergeCell" -> Ranges.parse(xml.attribute("ref"), sheet).ifPresent(merged::add);
          default -> {
            // views, formats, validation, drawings: nothing to audit
          }
        }
      }
      List<String> problems = problems();
      return new SheetPart(
          cells.build(), formulas.arrays(), merged, parser.hiddenRows(), hiddenColumns, problems);
    }

    private void readCells() throws IOException {
      try {
        parser.read();
      } catch (XMLStreamException e) {
        throw xml.fault(e);
      }
    }

    private void hideColumns() {
      if (xml.flag("hidden")) {
        int first = Math.max(1, xml.number("min", 1));
        int last = Math.min(Ranges.COLUMNS, xml.number("max", first));
        if (first <= last) {
          hiddenColumns.set(first - 1, last);
        }
      }
    }

    private List<String> problems() {
      List<String> problems = new ArrayList<>();
      int dropped = cells.dropUndefined();
      if (dropped > 0) {
        problems.add(
            "Sheet " + name + ": " + dropped + " cells share a formula whose text is missing.");
      }
      if (values.unreadable() > 0) {
        problems.add(
            "Sheet "
                + name
                + ": the stored values of "
                + values.unreadable()
                + " cells cannot be read.");
      }
      return problems;
    }
  }
}
