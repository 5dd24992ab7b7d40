package weighhouse.report.copy.ooxml;

/** The list of content types of a package. */
final class Types {
  private static final String NAME = "[Content_Types].xml";
  private static final String SPREADSHEET =
      "application/vnd.openxmlformats-officedocument.spreadsheetml.";

  private final Parts parts;

  Types(Parts parts) {
    this.parts = parts;
  }

  /** Declares a spreadsheet part, such as {@code comments}. */
  void declare(String part, String kind) {
    add("<%sOverride PartName=\"/" + part + "\" ContentType=\"" + SPREADSHEET + kind + "+xml\"/>");
  }

  /** Declares the drawings that hold the boxes of comments, where they are not. */
  void declareBoxes() {
    if (!parts.text(NAME).matches("(?s).*Extension\\s*=\\s*[\"']vml[\"'].*")) {
      add(
          "<%sDefault Extension=\"vml\""
              + " ContentType=\"application/vnd.openxmlformats-officedocument.vmlDrawing\"/>");
    }
  }

  void remove(String part) {
    String text = parts.text(NAME);
    for (XmlText.Tag tag = XmlText.opening(text, "Override", 0);
        tag != null;
        tag = XmlText.opening(text, "Override", tag.end())) {
      if (("/" + part).equals(tag.attribute("PartName"))) {
        parts.put(NAME, text.substring(0, tag.start()) + text.substring(tag.end()));
        return;
      }
    }
  }

  private void add(String entry) {
    String text = parts.text(NAME);
    XmlText.Tag root = XmlText.opening(text, "Types", 0);
    parts.put(NAME, Insert.last(text, root, entry.formatted(root.prefix())));
  }
}
