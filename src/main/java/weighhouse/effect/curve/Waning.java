package weighhouse.effect.curve;

/**
 * How a hazard ratio fades to 1 between two times. Both conventions are in use; they differ in
 * between. Fading a survival curve, a probability or a ratio of risks instead is neither.
 *
 * <p>Source: tsd-21 for effects that change over time; the two forms are common practice.
 */
public enum Waning {
  /** The ratio moves to 1 in a straight line. */
  LINEAR_IN_RATIO {
    @Override
    double between(double ratio, double left) {
      return 1 + (ratio - 1) * left;
    }
  },
  /** The logarithm of the ratio moves to 0 in a straight line. */
  LINEAR_IN_LOG {
    @Override
    double between(double ratio, double left) {
      return Math.pow(ratio, left);
    }
  };

  abstract double between(double ratio, double left);

  /**
   * The hazard ratio at a time: the full one until {@code start}, 1 from {@code end} on.
   *
   * @param ratio the full hazard ratio, above 0
   * @param start when it begins to fade, at least 0
   * @param end when nothing is left, at least {@code start}
   * @return NaN where end lies before start or a number is out of its domain
   */
  public double ratio(double time, double ratio, double start, double end) {
    if (!(time >= 0 && ratio > 0 && start >= 0 && end >= start)) {
      return Double.NaN;
    }
    if (time <= start && time < end) {
      return ratio;
    }
    return time >= end ? 1 : between(ratio, (end - time) / (end - start));
  }
}
