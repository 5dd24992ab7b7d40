package weighhouse.recalculate.functions;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Numbers read from text and shown as text, as in cells of the General format. */
public final class NumberText {
  private static final Pattern NUMBER =
      Pattern.compile(
          "\\(?([-+]?)\\s*[$€£]?((?:\\d{1,3}(?:,\\d{3})+|\\d+)?(?:\\.\\d*)?)(?:[eE]([-+]?\\d{1,3}))?\\s*(%?)\\)?");

  /** Excel keeps 15 significant digits. */
  private static final MathContext DIGITS = new MathContext(15, RoundingMode.HALF_UP);

  private NumberText() {}

  /**
   * The number that a text reads as ({@code 1,234.5}, {@code 12%}, {@code 1E3}, a date), or NaN.
   */
  public static double parse(String text) {
    String trimmed = text.strip();
    Matcher matcher = NUMBER.matcher(trimmed);
    if (!matcher.matches() || matcher.group(2).isEmpty() || matcher.group(2).equals(".")) {
      return Dates.parse(trimmed);
    }
    boolean bracketed = trimmed.startsWith("(");
    if (bracketed != trimmed.endsWith(")")) {
      return Double.NaN;
    }
    String exponent = matcher.group(3) == null ? "" : "e" + matcher.group(3);
    double number = Double.parseDouble(matcher.group(2).replace(",", "") + exponent);
    boolean negative = bracketed || matcher.group(1).equals("-");
    double signed = negative ? -number : number;
    return matcher.group(4).isEmpty() ? signed : signed / 100;
  }

  /** The number as text in the General format. */
  public static String general(double number) {
    if (number == Math.rint(number) && Math.abs(number) < 1e15) {
      return Long.toString((long) number);
    }
    BigDecimal rounded = new BigDecimal(number).round(DIGITS).stripTrailingZeros();
    int exponent = rounded.precision() - rounded.scale() - 1;
    if (exponent > 20 || exponent < -19 || (exponent < -4 && rounded.scale() > 20)) {
      return scientific(rounded, exponent);
    }
    return rounded.toPlainString();
  }

  private static String scientific(BigDecimal number, int exponent) {
    String mantissa = number.movePointLeft(exponent).stripTrailingZeros().toPlainString();
    String digits = Integer.toString(Math.abs(exponent));
    return mantissa + "E" + (exponent < 0 ? "-" : "+") + (digits.length() < 2 ? "0" : "") + digits;
  }
}
