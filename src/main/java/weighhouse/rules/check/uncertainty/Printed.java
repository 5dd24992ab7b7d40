package weighhouse.rules.check.uncertainty;

import weighhouse.effect.estimate.LogSymmetry;
import weighhouse.rules.check.ratio.Estimate;
import weighhouse.rules.check.ratio.ModelView;

/**
 * The figures of an estimate with the precision to which they were printed.
 *
 * @param decimals digits after the point that all of them can be trusted to have had
 */
record Printed(double ratio, double lower, double upper, int decimals) {
  private static final int SHOWN = 2;
  private static final int MOST = 9;

  static Printed of(Estimate estimate, ModelView model) {
    double ratio = model.value(estimate.cell());
    double lower = model.value(estimate.lower());
    double upper = model.value(estimate.upper());
    int own = LogSymmetry.decimals(ratio);
    int limits = Math.max(LogSymmetry.decimals(lower), LogSymmetry.decimals(upper));
    // 0.7 beside 0.55 was 0.70; a last zero is not stored.
    int decimals =
        Math.min(Math.max(own, Math.min(limits, SHOWN)), Math.max(limits, Math.min(own, SHOWN)));
    return new Printed(ratio, lower, upper, Math.min(decimals, MOST));
  }

  boolean positive() {
    return ratio > 0 && lower > 0 && upper > 0;
  }

  /** Half a unit of the last digit. */
  double half() {
    return 0.5000001 * Math.pow(10, -decimals);
  }

  LogSymmetry symmetry() {
    return LogSymmetry.of(ratio, lower, upper, decimals);
  }

  /** A figure with one digit more than printed. */
  String show(double figure) {
    int digits = Math.min(decimals + 1, 4);
    return String.format(java.util.Locale.ROOT, "%." + digits + "f", figure);
  }
}
