package weighhouse.workbook.ooxml;

import java.io.IOException;
import javax.xml.stream.XMLStreamException;
import org.codehaus.stax2.XMLStreamReader2;
import weighhouse.workbook.CellsBuilder;

/** The stored values of cells: {@code v} and {@code is} elements. */
final class CellValues {
  private final XMLStreamReader2 xml;
  private final XmlPart part;
  private final CellsBuilder cells;
  private final int sharedTexts;
  private final boolean date1904;
  private final Letters letters = new Letters();
  private int unreadable;

  CellValues(XmlPart part, CellsBuilder cells, int sharedTexts, boolean date1904) {
    this.xml = part.reader();
    this.part = part;
    this.cells = cells;
    this.sharedTexts = sharedTexts;
    this.date1904 = date1904;
  }

  /** How many values were not what their type says; their cells are as if without value. */
  int unreadable() {
    return unreadable;
  }

  void skip() throws XMLStreamException {
    letters.read(xml);
  }

  void readInline() throws XMLStreamException, IOException {
    cells.text(SharedTexts.joined(part));
  }

  void read(CellType type) throws XMLStreamException, IOException {
    letters.read(xml);
    switch (type) {
      case NUMBER -> number();
      case SHARED_TEXT -> shared();
      case FORMULA_TEXT, INLINE_TEXT -> cells.text(Escapes.decode(letters.toString()));
      case BOOLEAN -> cells.bool(letters.length > 0 && "1tT".indexOf(letters.array[0]) >= 0);
      case ERROR -> cells.error(letters.toString().strip());
      case DATE -> date();
    }
  }

  private void number() {
    double value = Numbers.parse(letters.array, letters.length);
    if (!Double.isNaN(value)) {
      cells.number(value);
    } else if (!letters.toString().isBlank()) {
      unreadable++;
    }
  }

  private void shared() {
    double index = Numbers.parse(letters.array, letters.length);
    if (index >= 0 && index < sharedTexts && index == (int) index) {
      cells.sharedText((int) index);
    } else {
      unreadable++;
    }
  }

  private void date() {
    double serial = IsoDates.serial(letters.toString().strip(), date1904);
    if (Double.isNaN(serial)) {
      unreadable++;
    } else {
      cells.number(serial);
    }
  }
}
