package weighhouse.workbook.ooxml;

import java.util.Arrays;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import org.codehaus.stax2.XMLStreamReader2;

/** The letters of one element, in an array that is used again for the next. */
final class Letters {
  char[] array = new char[256];
  int length;

  /** Takes the text of the element at hand, which is left behind with all that stands in it. */
  void read(XMLStreamReader2 xml) throws XMLStreamException {
    length = 0;
    for (int depth = 1; depth > 0; ) {
      switch (xml.next()) {
        case XMLStreamConstants.START_ELEMENT -> depth++;
        case XMLStreamConstants.END_ELEMENT -> depth--;
        case XMLStreamConstants.CHARACTERS, XMLStreamConstants.CDATA -> append(xml);
        default -> {
          // comments and processing instructions are no text
        }
      }
    }
  }

  private void append(XMLStreamReader2 xml) throws XMLStreamException {
    int more = xml.getTextLength();
    if (length + more > array.length) {
      array = Arrays.copyOf(array, Math.max(length + more, array.length * 2));
    }
    System.arraycopy(xml.getTextCharacters(), xml.getTextStart(), array, length, more);
    length += more;
  }

  /** Index of the first letter that is not blank and no equals sign: where a formula starts. */
  int formulaStart() {
    int start = 0;
    while (start < length && (array[start] <= ' ' || array[start] == '=')) {
      start++;
    }
    return start;
  }

  @Override
  public String toString() {
    return new String(array, 0, length);
  }
}
