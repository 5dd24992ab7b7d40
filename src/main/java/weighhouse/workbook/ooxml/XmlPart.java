package weighhouse.workbook.ooxml;

import com.fasterxml.aalto.stax.InputFactoryImpl;
import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import org.codehaus.stax2.XMLStreamReader2;
import weighhouse.workbook.WorkbookFault;

/**
 * A streaming parser over one part. Elements and attributes are told by their local names, so that
 * transitional and strict namespaces and any prefix read alike. Document types are refused: a
 * workbook has none, and they are how entities come in.
 */
final class XmlPart implements Closeable {
  private static final InputFactoryImpl FACTORY = factory();

  private final String name;
  private final InputStream in;
  private final XMLStreamReader2 xml;

  private XmlPart(String name, InputStream in) throws IOException {
    this.name = name;
    this.in = in;
    try {
      xml = (XMLStreamReader2) FACTORY.createXMLStreamReader(in);
      toRoot();
    } catch (XMLStreamException e) {
      throw fault(e);
    }
  }

  /** Opens a part and stands at its root element. */
  static XmlPart open(ZipArchive archive, String name) throws IOException {
    InputStream in = archive.open(name);
    try {
      return new XmlPart(name, in);
    } catch (IOException e) {
      in.close();
      throw e;
    }
  }

  private static InputFactoryImpl factory() {
    InputFactoryImpl factory = new InputFactoryImpl();
    factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
    factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
    factory.setProperty(XMLInputFactory.IS_COALESCING, false);
    return factory;
  }

  private void toRoot() throws XMLStreamException, WorkbookFault {
    for (int event = xml.next(); event != XMLStreamConstants.START_ELEMENT; event = xml.next()) {
      if (event == XMLStreamConstants.DTD) {
        throw new WorkbookFault(
            "holds a document type declaration in its part "
                + name
                + ", which no workbook needs and attacks use, and was left unread: save it in"
                + " Excel");
      }
    }
  }

  /** The parser itself, for the parts that are large. */
  XMLStreamReader2 reader() {
    return xml;
  }

  String element() {
    return xml.getLocalName();
  }

  /** Moves to the next start of an element; false at the end of the part. */
  boolean nextElement() throws IOException {
    try {
      while (xml.hasNext()) {
        if (xml.next() == XMLStreamConstants.START_ELEMENT) {
          return true;
        }
      }
      return false;
    } catch (XMLStreamException e) {
      throw fault(e);
    }
  }

  /** The attribute's value, or null. */
  String attribute(String localName) {
    for (int i = 0; i < xml.getAttributeCount(); i++) {
      if (xml.getAttributeLocalName(i).equals(localName)) {
        return xml.getAttributeValue(i);
      }
    }
    return null;
  }

  String attribute(String localName, String otherwise) {
    String value = attribute(localName);
    return value == null ? otherwise : value;
  }

  /** Whether the attribute says yes, as XML Schema writes it. */
  boolean flag(String localName) {
    String value = attribute(localName);
    return "1".equals(value) || "true".equals(value) || "on".equals(value);
  }

  /** A whole number, or the other where there is none. */
  int number(String localName, int otherwise) {
    String value = attribute(localName);
    try {
      return value == null ? otherwise : Integer.parseInt(value.strip());
    } catch (NumberFormatException e) {
      return otherwise;
    }
  }

  /** All text of the element at hand, which is left behind. */
  String text() throws IOException {
    return collect(null, null);
  }

  /**
   * The text within {@code t} elements of the element at hand, which is left behind.
   *
   * @param except name of elements whose text does not count
   */
  String runs(String except) throws IOException {
    return collect("t", except);
  }

  private String collect(String within, String except) throws IOException {
    StringBuilder text = new StringBuilder();
    try {
      int skipped = 0;
      boolean taken = within == null;
      for (int depth = 1; depth > 0; ) {
        int event = xml.next();
        if (event == XMLStreamConstants.START_ELEMENT) {
          depth++;
          skipped = skipped > 0 || element().equals(except) ? skipped + 1 : 0;
          taken = within == null || element().equals(within);
        } else if (event == XMLStreamConstants.END_ELEMENT) {
          depth--;
          skipped = Math.max(0, skipped - 1);
          taken = within == null;
        } else if (taken && skipped == 0 && isText(event)) {
          text.append(xml.getTextCharacters(), xml.getTextStart(), xml.getTextLength());
        }
      }
    } catch (XMLStreamException e) {
      throw fault(e);
    }
    return text.toString();
  }

  private static boolean isText(int event) {
    return event == XMLStreamConstants.CHARACTERS
        || event == XMLStreamConstants.CDATA
        || event == XMLStreamConstants.SPACE;
  }

  /** What to tell the user of a part that is not well-formed. */
  IOException fault(XMLStreamException e) {
    for (Throwable cause = e; cause != null; cause = cause.getCause()) {
      if (cause instanceof WorkbookFault fault) {
        return fault;
      }
      if (cause instanceof XMLStreamException nested && nested.getNestedException() != null) {
        if (nested.getNestedException() instanceof WorkbookFault fault) {
          return fault;
        }
      }
    }
    return new WorkbookFault(
        "is damaged (its part "
            + name
            + " is not well-formed XML): open it in Excel, let Excel repair it and save it",
        e);
  }

  @Override
  public void close() throws IOException {
    in.close();
  }
}
