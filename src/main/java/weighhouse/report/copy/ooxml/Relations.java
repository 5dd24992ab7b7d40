package weighhouse.report.copy.ooxml;

import java.net.URI;

/** The relationships of one part, as far as they are needed and added to. */
final class Relations {
  private static final String EMPTY =
      "<?xml version=\"1.0\" encoding=\"UTF-8\" standalone=\"yes\"?>\n"
          + "<Relationships xmlns=\"http://schemas.openxmlformats.org/package/2006/relationships\"/>";

  private final Parts parts;
  private final String owner;
  private final String name;

  /** The relationships of the part of that name; empty where it has none. */
  Relations(Parts parts, String owner) {
    this.parts = parts;
    this.owner = owner;
    int slash = owner.lastIndexOf('/') + 1;
    name = owner.substring(0, slash) + "_rels/" + owner.substring(slash) + ".rels";
  }

  /** The part of the first relationship whose type ends so; null where there is none. */
  String target(String typeEnd) {
    XmlText.Tag tag = find("Type", typeEnd, true);
    return tag == null ? null : resolve(tag.attribute("Target"));
  }

  /** The part of the relationship of that id; null where there is none. */
  String byId(String id) {
    XmlText.Tag tag = find("Id", id, false);
    return tag == null ? null : resolve(tag.attribute("Target"));
  }

  /** What stands before {@code /worksheet} in the types of this file. */
  String typeBase() {
    XmlText.Tag tag = find("Type", "/worksheet", true);
    String type = tag == null ? null : tag.attribute("Type");
    return type == null
        ? "http://schemas.openxmlformats.org/officeDocument/2006/relationships"
        : type.substring(0, type.length() - "/worksheet".length());
  }

  /** Adds a relationship to a part; gives its id. */
  String add(String type, String part) {
    String text = parts.has(name) ? parts.text(name) : EMPTY;
    int number = 1;
    while (text.contains("\"wh" + number + "\"")) {
      number++;
    }
    XmlText.Tag root = XmlText.opening(text, "Relationships", 0);
    String entry =
        "<%sRelationship Id=\"wh%d\" Type=\"%s\" Target=\"/%s\"/>"
            .formatted(root.prefix(), number, type, part);
    parts.put(name, Insert.last(text, root, entry));
    return "wh" + number;
  }

  /** Takes the relationships whose type ends so. */
  void remove(String typeEnd) {
    XmlText.Tag tag = find("Type", typeEnd, true);
    if (tag != null) {
      String text = parts.text(name);
      parts.put(name, text.substring(0, tag.start()) + text.substring(tag.end()));
    }
  }

  private XmlText.Tag find(String attribute, String wanted, boolean atEnd) {
    String text = parts.text(name);
    XmlText.Tag tag = text == null ? null : XmlText.opening(text, "Relationship", 0);
    while (tag != null) {
      String value = tag.attribute(attribute);
      if (value != null && (atEnd ? value.endsWith(wanted) : value.equals(wanted))) {
        return tag;
      }
      tag = XmlText.opening(text, "Relationship", tag.end());
    }
    return null;
  }

  private String resolve(String target) {
    String path =
        URI.create("/" + owner).resolve(XmlText.unescape(target).replace(" ", "%20")).getPath();
    return path.substring(1);
  }
}
