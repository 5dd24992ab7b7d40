package weighhouse.recalculate.functions;

import java.util.regex.Pattern;

/**
 * Excel's wildcards: {@code *} any text, {@code ?} one character, {@code ~} takes the next as is.
 */
final class Wildcard {
  private Wildcard() {}

  static boolean has(String text) {
    return text.indexOf('*') >= 0 || text.indexOf('?') >= 0 || text.indexOf('~') >= 0;
  }

  static Pattern pattern(String text) {
    StringBuilder regex = new StringBuilder();
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == '*') {
        regex.append(".*");
      } else if (c == '?') {
        regex.append('.');
      } else {
        boolean escapes = c == '~' && i + 1 < text.length() && has(text.substring(i + 1, i + 2));
        regex.append(Pattern.quote(escapes ? text.substring(++i, i + 1) : String.valueOf(c)));
      }
    }
    return Pattern.compile(
        regex.toString(), Pattern.CASE_INSENSITIVE | Pattern.UNICODE_CASE | Pattern.DOTALL);
  }
}
