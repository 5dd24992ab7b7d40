package weighhouse.quantity.inference;

import java.util.regex.Pattern;

/** Numbers that are stored as text. */
final class NumberText {
  private static final int LONGEST = 24;
  private static final Pattern NUMBER =
      Pattern.compile("\\s*[-+]?(\\d+([.,]\\d*)?|[.,]\\d+)([eE][-+]?\\d+)?\\s*%?\\s*");

  private NumberText() {}

  static boolean isNumber(String text) {
    return text.length() <= LONGEST && NUMBER.matcher(text).matches();
  }

  /** The number of a text; NaN if it is none. */
  static double number(String text) {
    if (text == null || !isNumber(text)) {
      return Double.NaN;
    }
    String plain = text.strip().replace(',', '.');
    return plain.endsWith("%")
        ? Double.parseDouble(plain.substring(0, plain.length() - 1).strip()) / 100
        : Double.parseDouble(plain);
  }
}
