package weighhouse.rules.term;

/** When two functions known only by their values are the same. */
public final class Identity {
  private static final double TOLERANCE = 1e-9;

  private Identity() {}

  /** Whether two values agree but for rounding; false where either is not defined. */
  public static boolean agree(double a, double b) {
    return Math.abs(a - b) <= TOLERANCE * Math.max(1e-6, Math.max(Math.abs(a), Math.abs(b)));
  }

  /**
   * Whether {@code y = a + b * x} holds through all points with one b that is not 0. A function of
   * which this is true for varying operands holds the other and nothing else of those operands.
   */
  public static boolean affine(double[] x, double[] y) {
    double slope = (y[1] - y[0]) / (x[1] - x[0]);
    double size = 0;
    for (double value : y) {
      size = Math.max(size, Math.abs(value));
    }
    if (!(Math.abs(y[1] - y[0]) > TOLERANCE * Math.max(1e-6, size)) || !Double.isFinite(slope)) {
      return false;
    }
    for (int i = 2; i < x.length; i++) {
      double expected = y[0] + slope * (x[i] - x[0]);
      if (!(Math.abs(y[i] - expected) <= TOLERANCE * Math.max(1e-6, size))) {
        return false;
      }
    }
    return true;
  }
}
