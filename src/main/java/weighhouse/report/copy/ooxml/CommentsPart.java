package weighhouse.report.copy.ooxml;

import java.util.Map;
import weighhouse.report.copy.edit.Edits;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;

/** The comments of a sheet: its own stay, ours are added, two at one cell become one. */
final class CommentsPart {
  private static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";

  private CommentsPart() {}

  /** A part with nothing but our author. */
  static String empty() {
    return "<?xml version=\"1.0\" encoding=\"UTF-8\" standalone=\"yes\"?>\n<comments xmlns=\""
        + MAIN
        + "\"><authors/><commentList/></comments>";
  }

  /** The text of the part with our comments in it. */
  static String with(String part, Map<CellAddress, String> comments) {
    XmlText.Tag authors = XmlText.opening(part, "authors", 0);
    int author = 0;
    for (XmlText.Tag tag = XmlText.opening(part, "author", authors.end());
        tag != null;
        tag = XmlText.opening(part, "author", tag.end())) {
      author++;
    }
    String prefix = authors.prefix();
    String text =
        Insert.last(part, authors, "<%1$sauthor>%2$s</%1$sauthor>".formatted(prefix, Edits.AUTHOR));
    for (Map.Entry<CellAddress, String> comment : comments.entrySet()) {
      String cell = A1.cell(comment.getKey().row(), comment.getKey().column());
      text = add(text, prefix, cell, comment.getValue(), author);
    }
    return text;
  }

  /** Whether the part holds a comment at the cell. */
  static boolean has(String part, String cell) {
    return at(part, cell) != null;
  }

  private static String add(String part, String prefix, String cell, String said, int author) {
    String run =
        "<%1$sr><%1$st xml:space=\"preserve\">%2$s</%1$st></%1$sr>"
            .formatted(prefix, XmlText.escape(said));
    XmlText.Tag present = at(part, cell);
    if (present != null) {
      return extended(part, present, prefix, run);
    }
    String comment =
        "<%1$scomment ref=\"%2$s\" authorId=\"%3$d\"><%1$stext>%4$s</%1$stext></%1$scomment>"
            .formatted(prefix, cell, author, run);
    return Insert.last(part, XmlText.opening(part, "commentList", 0), comment);
  }

  private static String extended(String part, XmlText.Tag comment, String prefix, String run) {
    XmlText.Tag text = XmlText.opening(part, "text", comment.end());
    XmlText.Tag first = XmlText.next(part, text.end());
    if (text.empty() || !first.localName().equals("t")) {
      return Insert.last(part, text, run);
    }
    // a plain text cannot stand beside a run, so it becomes one
    XmlText.Tag end = XmlText.closing(part, "t", first.end());
    String plain = part.substring(first.start(), end.end());
    String both = "<%1$sr>%2$s</%1$sr>%3$s".formatted(prefix, plain, run);
    return part.substring(0, first.start()) + both + part.substring(end.end());
  }

  private static XmlText.Tag at(String part, String cell) {
    XmlText.Tag tag = XmlText.opening(part, "comment", 0);
    while (tag != null && !cell.equals(tag.attribute("ref"))) {
      tag = XmlText.opening(part, "comment", tag.end());
    }
    return tag;
  }
}
