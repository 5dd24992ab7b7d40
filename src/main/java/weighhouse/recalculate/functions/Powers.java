package weighhouse.recalculate.functions;

/** Raising to a power. */
public final class Powers {
  private Powers() {}

  /** Excel's power: NaN for {@code 0^0} and for roots of negatives, infinite for {@code 0^-1}. */
  public static double of(double base, double exponent) {
    return base == 0 && exponent == 0 ? Double.NaN : Math.pow(base, exponent);
  }
}
