package weighhouse.report.text;

/**
 * Text of a workbook made fit to be shown: characters that a reader cannot see but a terminal or a
 * browser obeys are spelled out. Line breaks and tabs become spaces.
 */
public final class Visible {
  private Visible() {}

  /** The text with every control, direction mark and lone surrogate spelled as {@code ‹U+202E›}. */
  public static String text(String raw) {
    if (raw == null) {
      return "";
    }
    int i = 0;
    while (i < raw.length() && harmless(raw.charAt(i))) {
      i++;
    }
    return i == raw.length() ? raw : spelled(raw, i);
  }

  /** The same, cut after so many characters with an ellipsis. */
  public static String shortened(String raw, int most) {
    String text = text(raw);
    if (text.length() <= most) {
      return text;
    }
    int cut = Character.isHighSurrogate(text.charAt(most - 2)) ? most - 2 : most - 1;
    return text.substring(0, cut).stripTrailing() + "…";
  }

  private static String spelled(String raw, int from) {
    StringBuilder out = new StringBuilder(raw.length() + 8).append(raw, 0, from);
    for (int i = from; i < raw.length(); ) {
      int point = raw.codePointAt(i);
      i += Character.charCount(point);
      if (point == '\n' || point == '\r' || point == '\t') {
        out.append(' ');
      } else if (obeyed(point)) {
        out.append("‹U+").append(hex(point)).append('›');
      } else {
        out.appendCodePoint(point);
      }
    }
    return out.toString();
  }

  private static boolean harmless(char c) {
    return (c >= ' ' && c < 0x7f) || (c > 0xa0 && !Character.isSurrogate(c) && !obeyed(c));
  }

  private static boolean obeyed(int point) {
    return switch (Character.getType(point)) {
      case Character.CONTROL, Character.SURROGATE, Character.LINE_SEPARATOR -> true;
      case Character.PARAGRAPH_SEPARATOR, Character.UNASSIGNED -> true;
      // joiners shape letters of some scripts and emoji; all other format characters only hide
      case Character.FORMAT -> point != 0x200c && point != 0x200d && point != 0xad;
      default -> false;
    };
  }

  private static String hex(int point) {
    String digits = Integer.toHexString(point).toUpperCase(java.util.Locale.ROOT);
    return "0".repeat(Math.max(0, 4 - digits.length())) + digits;
  }
}
