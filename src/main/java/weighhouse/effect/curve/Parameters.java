package weighhouse.effect.curve;

/** Domains of curve parameters. */
final class Parameters {
  private Parameters() {}

  static void requirePositive(String name, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(name + " must be above 0 and finite, not " + value);
    }
  }

  static void requireFinite(String name, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(name + " must be a finite number, not " + value);
    }
  }

  /** The time itself; NaN below 0. */
  static double time(double time) {
    return time >= 0 ? time : Double.NaN;
  }
}
