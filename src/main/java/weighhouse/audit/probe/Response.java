package weighhouse.audit.probe;

import java.util.List;
import weighhouse.audit.ActsOn;

/**
 * How one probability answers when a ratio is moved: its value with the ratio at 1 and at several
 * other settings.
 *
 * @param neutral the probability with the ratio at 1
 * @param settings the ratio's settings, none of them 1
 * @param probabilities the probability at each setting
 */
record Response(double neutral, List<Double> settings, List<Double> probabilities) {
  /** Rounding in chains of formulas stays below this; neighbouring scales differ by far more. */
  private static final double AGREEMENT = 1e-7;

  /** A reading of the response: the scale, and the power of the ratio that acts there. */
  record Reading(ActsOn scale, double exponent) {
    boolean plain() {
      return Math.abs(exponent - 1) < 1e-6;
    }
  }

  boolean moves() {
    return probabilities.stream()
        .anyMatch(p -> Math.abs(p - neutral) > 1e-13 * Math.max(1, Math.abs(neutral)));
  }

  /**
   * The scale on which every setting R acts as R to one constant power, a plain product preferred;
   * MIXED where no scale explains all settings.
   */
  Reading read() {
    if (!moves()) {
      return new Reading(ActsOn.NOTHING, 0);
    }
    Reading best = new Reading(ActsOn.MIXED, Double.NaN);
    for (Scale scale : Scale.values()) {
      double exponent = exponent(scale);
      if (Double.isNaN(exponent)) {
        continue;
      }
      Reading reading = new Reading(scale.actsOn(), exponent);
      if (reading.plain()) {
        return reading;
      }
      if (best.scale() == ActsOn.MIXED) {
        best = reading;
      }
    }
    return best;
  }

  /** The power of R that acts on the scale; NaN where no one power fits all settings. */
  private double exponent(Scale scale) {
    double common = Double.NaN;
    for (int i = 0; i < settings.size(); i++) {
      double log = Math.log(scale.ratio(probabilities.get(i), neutral));
      double exponent = log / Math.log(settings.get(i));
      if (Double.isNaN(exponent) || Double.isInfinite(exponent)) {
        return Double.NaN;
      }
      if (i == 0) {
        common = exponent;
      } else if (Math.abs(exponent - common) > AGREEMENT * Math.max(1, Math.abs(common))) {
        return Double.NaN;
      }
    }
    return common;
  }
}
