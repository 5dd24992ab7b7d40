package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.util.HashMap;
import java.util.Map;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Reads the notes and the threaded comments of a sheet. */
final class CommentParts {
  private CommentParts() {}

  /** Texts by cell; a thread replaces the note that stands in for it in older programs. */
  static Map<CellAddress, String> read(ZipArchive archive, Relationships parts, int sheet)
      throws IOException {
    Map<CellAddress, String> comments = new HashMap<>();
    for (Relationships.Relationship part : parts.ofType("comments")) {
      comments.putAll(read(archive, part.target(), "comment", sheet));
    }
    for (Relationships.Relationship part : parts.ofType("threadedComment")) {
      comments.putAll(read(archive, part.target(), "threadedComment", sheet));
    }
    return comments;
  }

  private static Map<CellAddress, String> read(
      ZipArchive archive, String part, String element, int sheet) throws IOException {
    Map<CellAddress, String> comments = new HashMap<>();
    try (XmlPart xml = XmlPart.open(archive, part)) {
      while (xml.nextElement()) {
        if (xml.element().equals(element)) {
          CellAddress cell =
              Ranges.parse(xml.attribute("ref"), sheet).map(CellRange::first).orElse(null);
          String text = element.equals("comment") ? SharedTexts.joined(xml) : xml.text().strip();
          if (cell != null && !text.isEmpty()) {
            comments.merge(cell, text, (first, reply) -> first + "\n" + reply);
          }
        }
      }
    }
    return comments;
  }
}
