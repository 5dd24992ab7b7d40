package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** Reads texts: the shared strings table, and the parts of rich text wherever they stand. */
final class SharedTexts {
  /** Readings of East Asian words, which are no part of the text. */
  private static final String PHONETIC = "rPh";

  private SharedTexts() {}

  /** All texts in order; the runs of rich text joined. */
  static List<String> read(ZipArchive archive, String part) throws IOException {
    List<String> texts = new ArrayList<>();
    try (XmlPart xml = XmlPart.open(archive, part)) {
      while (xml.nextElement()) {
        if (xml.element().equals("si")) {
          texts.add(joined(xml));
        }
      }
    }
    return texts;
  }

  /** The text of the element at hand, which is left behind. */
  static String joined(XmlPart xml) throws IOException {
    return Escapes.decode(xml.runs(PHONETIC));
  }
}
