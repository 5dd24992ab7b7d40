package weighhouse.formula.normal;

import java.math.BigDecimal;

/**
 * The number in front of a product: a fraction of whole numbers as long as they stay small, a
 * double otherwise, so that 1/12*12 is 1 and 0.1*3 is 0.3.
 *
 * @param numerator whole, or any number where the denominator is 1
 * @param denominator whole and positive; 1 for inexact numbers
 */
public record Coefficient(double numerator, double denominator) {
  public static final Coefficient ZERO = new Coefficient(0, 1);
  public static final Coefficient ONE = new Coefficient(1, 1);
  public static final Coefficient MINUS_ONE = new Coefficient(-1, 1);

  /** Up to here doubles hold every whole number. */
  private static final double LARGEST = 1L << 52;

  /** The number; decimals of up to 15 digits become fractions of whole numbers. */
  public static Coefficient of(double value) {
    if (value == Math.rint(value) || Double.isNaN(value) || Double.isInfinite(value)) {
      return new Coefficient(value + 0.0, 1);
    }
    BigDecimal decimal = BigDecimal.valueOf(value);
    double denominator = Math.pow(10, decimal.scale());
    double numerator = decimal.unscaledValue().doubleValue();
    return decimal.scale() <= 15 ? fraction(numerator, denominator) : new Coefficient(value, 1);
  }

  private static Coefficient fraction(double numerator, double denominator) {
    boolean exact =
        isWhole(numerator) && isWhole(denominator) && denominator != 0 && numerator != 0;
    if (!exact) {
      return new Coefficient(numerator / denominator + 0.0, 1);
    }
    double divisor = gcd(Math.abs(numerator), Math.abs(denominator)) * Math.signum(denominator);
    return new Coefficient(numerator / divisor, denominator / divisor);
  }

  private static boolean isWhole(double value) {
    return value == Math.rint(value) && Math.abs(value) <= LARGEST;
  }

  private static double gcd(double a, double b) {
    double x = a;
    double y = b;
    while (y != 0) {
      double rest = x % y;
      x = y;
      y = rest;
    }
    return x;
  }

  public double value() {
    return numerator / denominator;
  }

  public Coefficient plus(Coefficient other) {
    return fraction(
        numerator * other.denominator + other.numerator * denominator,
        denominator * other.denominator);
  }

  public Coefficient times(Coefficient other) {
    return fraction(numerator * other.numerator, denominator * other.denominator);
  }

  /** One divided by this; infinite for zero. */
  public Coefficient inverse() {
    return fraction(denominator, numerator);
  }

  public Coefficient negated() {
    return new Coefficient(0.0 - numerator, denominator);
  }

  /** The largest fraction of which both are whole multiples; one where they are no fractions. */
  Coefficient common(Coefficient other) {
    double top = gcd(Math.abs(numerator), Math.abs(other.numerator));
    double bottom = denominator / gcd(denominator, other.denominator) * other.denominator;
    boolean exact = isWhole(numerator) && isWhole(other.numerator) && isWhole(bottom);
    return exact ? fraction(top, bottom) : ONE;
  }

  /** This to a small whole power. */
  public Coefficient power(int exponent) {
    Coefficient result = ONE;
    for (int i = 0; i < Math.abs(exponent); i++) {
      result = result.times(this);
    }
    return exponent < 0 ? result.inverse() : result;
  }

  public boolean isZero() {
    return numerator == 0;
  }

  public boolean isOne() {
    return equals(ONE);
  }

  public boolean isNegative() {
    return numerator < 0;
  }

  public boolean isInteger() {
    return denominator == 1 && isWhole(numerator);
  }

  public Coefficient abs() {
    return isNegative() ? negated() : this;
  }

  @Override
  public String toString() {
    return denominator == 1 ? Double.toString(numerator) : numerator + "/" + denominator;
  }
}
