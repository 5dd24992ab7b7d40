package weighhouse.report.copy.ooxml;

import java.nio.charset.StandardCharsets;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The text of an XML part as it is edited: tags are found in it, the rest is left alone. */
final class XmlText {
  private XmlText() {}

  /**
   * A tag in a text.
   *
   * @param start position of its opening bracket
   * @param end position after its closing bracket
   * @param raw the tag itself
   * @param name with its prefix
   */
  record Tag(int start, int end, String raw, String name) {
    private static final Pattern ATTRIBUTE =
        Pattern.compile("([^\\s=/<>\"']+)\\s*=\\s*(?:\"([^\"]*)\"|'([^']*)')");

    String localName() {
      return name.substring(name.indexOf(':') + 1);
    }

    String prefix() {
      return name.substring(0, name.indexOf(':') + 1);
    }

    boolean closes() {
      return raw.charAt(1) == '/';
    }

    boolean empty() {
      return raw.charAt(raw.length() - 2) == '/';
    }

    /** The attribute's value, still escaped; null where the tag has none of that name. */
    String attribute(String wanted) {
      Matcher matcher = ATTRIBUTE.matcher(raw);
      while (matcher.find()) {
        if (matcher.group(1).equals(wanted)) {
          return matcher.group(2) != null ? matcher.group(2) : matcher.group(3);
        }
      }
      return null;
    }

    /** The id of a relationship, whatever its namespace's prefix; null where there is none. */
    String relationship() {
      Matcher matcher = ATTRIBUTE.matcher(raw);
      while (matcher.find()) {
        if (matcher.group(1).endsWith(":id")) {
          return matcher.group(2) != null ? matcher.group(2) : matcher.group(3);
        }
      }
      return null;
    }

    /** The tag with the attribute set to a value that needs no escaping; null takes it away. */
    String with(String attribute, String value) {
      Matcher matcher = ATTRIBUTE.matcher(raw);
      String assignment = value == null ? "" : " " + attribute + "=\"" + value + "\"";
      while (matcher.find()) {
        if (matcher.group(1).equals(attribute)) {
          String before = raw.substring(0, matcher.start()).stripTrailing();
          return before + assignment + raw.substring(matcher.end());
        }
      }
      int tail = raw.length() - (empty() ? 2 : 1);
      return raw.substring(0, tail).stripTrailing() + assignment + raw.substring(tail);
    }
  }

  static String of(byte[] part) {
    return new String(part, StandardCharsets.UTF_8);
  }

  static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  /**
   * The next tag at or after a position; null at the end. Comments and the like are passed over.
   */
  static Tag next(String text, int from) {
    int start = text.indexOf('<', from);
    while (start >= 0) {
      char c = text.charAt(start + 1);
      if (c != '!' && c != '?') {
        return tag(text, start);
      }
      start = text.indexOf('<', afterMarkup(text, start));
    }
    return null;
  }

  /** The next opening or empty tag of that local name; null where there is none. */
  static Tag opening(String text, String localName, int from) {
    Tag tag = next(text, from);
    while (tag != null && (tag.closes() || !tag.localName().equals(localName))) {
      tag = next(text, tag.end());
    }
    return tag;
  }

  /** The closing tag of an element that does not nest in itself. */
  static Tag closing(String text, String localName, int from) {
    Tag tag = next(text, from);
    while (tag != null && !(tag.closes() && tag.localName().equals(localName))) {
      tag = next(text, tag.end());
    }
    return tag;
  }

  static String escape(String raw) {
    StringBuilder out = new StringBuilder(raw.length() + 8);
    for (int i = 0; i < raw.length(); i++) {
      char c = raw.charAt(i);
      switch (c) {
        case '&' -> out.append("&amp;");
        case '<' -> out.append("&lt;");
        case '>' -> out.append("&gt;");
        case '"' -> out.append("&quot;");
        default -> out.append(c);
      }
    }
    return out.toString();
  }

  static String unescape(String raw) {
    return raw.replace("&lt;", "<")
        .replace("&gt;", ">")
        .replace("&quot;", "\"")
        .replace("&apos;", "'")
        .replace("&amp;", "&");
  }

  private static int afterMarkup(String text, int start) {
    String end =
        text.startsWith("<!--", start) ? "-->" : text.startsWith("<![CDATA[", start) ? "]]>" : ">";
    int at = text.indexOf(end, start);
    return at < 0 ? text.length() : at + end.length();
  }

  private static Tag tag(String text, int start) {
    int end = start + 1;
    char quote = 0;
    while (end < text.length() && (quote != 0 || text.charAt(end) != '>')) {
      char c = text.charAt(end++);
      if (quote == 0 && (c == '"' || c == '\'')) {
        quote = c;
      } else if (c == quote) {
        quote = 0;
      }
    }
    String raw = text.substring(start, Math.min(end + 1, text.length()));
    int nameStart = raw.charAt(1) == '/' ? 2 : 1;
    int nameEnd = nameStart;
    while (nameEnd < raw.length() && " \t\r\n/>".indexOf(raw.charAt(nameEnd)) < 0) {
      nameEnd++;
    }
    return new Tag(start, start + raw.length(), raw, raw.substring(nameStart, nameEnd));
  }
}
