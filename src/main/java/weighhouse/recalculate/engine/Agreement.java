package weighhouse.recalculate.engine;

/** Whether two calculations of one number agree. */
final class Agreement {
  private static final double RELATIVE = 1e-9;

  /** What is left where nearly all digits cancel. */
  private static final double ABSOLUTE = 1e-12;

  private Agreement() {}

  static boolean of(double a, double b) {
    return Math.abs(a - b) <= RELATIVE * Math.max(Math.abs(a), Math.abs(b)) + ABSOLUTE;
  }
}
