package weighhouse.report.text;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import weighhouse.audit.Figure;

/** Numbers as people read them: four significant digits, thousands grouped by commas. */
public final class Numbers {
  private static final int DIGITS = 4;
  private static final int MOST_DIGITS = 9;

  private Numbers() {}

  /** The number, or a dash where there is none. */
  public static String show(double number) {
    return show(number, DIGITS);
  }

  /** The number or the error that stands in its place. */
  public static String show(Figure figure) {
    return show(figure, DIGITS);
  }

  /** Digits that tell the two figures apart, for {@link #show(Figure, int)}. */
  public static int digits(Figure one, Figure other) {
    boolean equal = one.number() == other.number() || one.error() != null || other.error() != null;
    int digits = DIGITS;
    while (!equal && digits < MOST_DIGITS && show(one, digits).equals(show(other, digits))) {
      digits++;
    }
    return digits;
  }

  /** The figure in so many significant digits; whole digits are never cut. */
  public static String show(Figure figure, int digits) {
    return figure.error() != null ? figure.error() : show(figure.number(), digits);
  }

  /** Change from one figure to another in percent, or a dash. */
  public static String change(Figure now, Figure corrected) {
    double change = (corrected.number() - now.number()) / Math.abs(now.number());
    if (Double.isNaN(change) || Double.isInfinite(change)) {
      return "–";
    }
    String percent = show(100 * change, 2);
    return (change > 0 ? "+" : "") + percent + " %";
  }

  private static String show(double number, int digits) {
    if (Double.isNaN(number)) {
      return "–";
    }
    if (Double.isInfinite(number)) {
      return number > 0 ? "∞" : "−∞";
    }
    double size = Math.abs(number);
    if (number == 0) {
      return "0";
    }
    if (size < 1e-5 || size >= 1e15) {
      return scientific(number, digits);
    }
    BigDecimal exact = BigDecimal.valueOf(number);
    int whole = Math.max(0, exact.precision() - exact.scale());
    BigDecimal rounded =
        exact.round(new MathContext(Math.max(digits, whole), RoundingMode.HALF_UP));
    return grouped(plain(rounded));
  }

  private static String scientific(double number, int digits) {
    BigDecimal rounded = BigDecimal.valueOf(number).round(new MathContext(digits));
    int exponent = rounded.precision() - rounded.scale() - 1;
    return plain(rounded.movePointLeft(exponent)) + "E" + exponent;
  }

  private static String plain(BigDecimal number) {
    BigDecimal stripped = number.stripTrailingZeros();
    return (stripped.scale() < 0 ? stripped.setScale(0) : stripped)
        .toPlainString()
        .replace('-', '−');
  }

  private static String grouped(String plain) {
    int point = plain.indexOf('.');
    StringBuilder out = new StringBuilder(plain);
    int first = plain.startsWith("−") ? 1 : 0;
    for (int i = (point < 0 ? plain.length() : point) - 3; i > first; i -= 3) {
      out.insert(i, ',');
    }
    return out.toString();
  }
}
