package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.BitSet;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import org.codehaus.stax2.XMLStreamReader2;
import weighhouse.workbook.CellsBuilder;
import weighhouse.workbook.WorkbookFault;

/** Reads the rows and cells of a sheet: the loop that most of the time of reading is spent in. */
final class CellsParser {
  private final XMLStreamReader2 xml;
  private final CellsBuilder cells;
  private final SheetFormulas formulas;
  private final CellValues values;
  private final BitSet hiddenRows = new BitSet();
  private final CellReference reference = new CellReference();
  private final CellType.Decoder type = new CellType.Decoder();
  private int row = -1;
  private int column = -1;
  private boolean dynamic;

  CellsParser(XMLStreamReader2 xml, CellsBuilder cells, SheetFormulas formulas, CellValues values) {
    this.xml = xml;
    this.cells = cells;
    this.formulas = formulas;
    this.values = values;
  }

  BitSet hiddenRows() {
    return hiddenRows;
  }

  /** Reads from the start of {@code sheetData} to its end. */
  void read() throws XMLStreamException, IOException {
    int depth = 1;
    while (depth > 0) {
      int event = xml.next();
      if (event == XMLStreamConstants.START_ELEMENT) {
        depth++;
        switch (xml.getLocalName()) {
          case "c" -> {
            startCell();
            readCell();
            depth--;
          }
          case "row" -> startRow();
          default -> {
            // extensions
          }
        }
      } else if (event == XMLStreamConstants.END_ELEMENT) {
        depth--;
      }
    }
  }

  private void startRow() throws XMLStreamException, WorkbookFault {
    row++;
    column = -1;
    boolean hidden = false;
    for (int i = 0; i < xml.getAttributeCount(); i++) {
      switch (xml.getAttributeLocalName(i)) {
        case "r" -> row = xml.getAttributeAsInt(i) - 1;
        case "hidden" -> hidden = xml.getAttributeAsBoolean(i);
        default -> {
          // height and style
        }
      }
    }
    checkInside();
    if (hidden) {
      hiddenRows.set(row);
    }
  }

  private void startCell() throws XMLStreamException, WorkbookFault {
    column++;
    int style = 0;
    dynamic = false;
    type.type = CellType.NUMBER;
    for (int i = 0; i < xml.getAttributeCount(); i++) {
      switch (xml.getAttributeLocalName(i)) {
        case "r" -> {
          xml.getAttributeAs(i, reference);
          row = reference.row;
          column = reference.column;
        }
        case "s" -> style = xml.getAttributeAsInt(i);
        case "t" -> xml.getAttributeAs(i, type);
        case "cm" -> dynamic = true;
        default -> {
          // rich values and phonetics
        }
      }
    }
    checkInside();
    cells.begin(row, column, style);
  }

  private void readCell() throws XMLStreamException, IOException {
    int event = xml.next();
    while (event != XMLStreamConstants.END_ELEMENT) {
      if (event == XMLStreamConstants.START_ELEMENT) {
        switch (xml.getLocalName()) {
          case "v" -> values.read(type.type);
          case "f" -> formulas.read(dynamic);
          case "is" -> values.readInline();
          default -> values.skip();
        }
      }
      event = xml.next();
    }
    cells.end();
  }

  private void checkInside() throws WorkbookFault {
    if (row < 0 || row >= Ranges.ROWS || column >= Ranges.COLUMNS) {
      throw new WorkbookFault(
          "has a cell beyond the last row or column that Excel allows (1,048,576 rows, 16,384"
              + " columns): open it in Excel, let Excel repair it and save it");
    }
  }
}
