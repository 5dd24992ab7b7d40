package weighhouse.workbook.ooxml;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Letters that XML cannot hold, written {@code _x000D_} (ECMA-376 part 1, 22.9.2.19). */
final class Escapes {
  private static final Pattern ESCAPE = Pattern.compile("_x([0-9A-Fa-f]{4})_");

  private Escapes() {}

  static String decode(String text) {
    if (!text.contains("_x")) {
      return text;
    }
    Matcher matcher = ESCAPE.matcher(text);
    return matcher.replaceAll(
        m -> Matcher.quoteReplacement(String.valueOf((char) Integer.parseInt(m.group(1), 16))));
  }
}
