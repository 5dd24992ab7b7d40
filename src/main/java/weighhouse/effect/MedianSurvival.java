package weighhouse.effect;

/**
 * Rates and hazard ratios read from median times, which holds for constant hazards only.
 *
 * <p>Medians not above 0, or infinite, give NaN. Source: the exponential distribution.
 */
public final class MedianSurvival {
  private static final double LN2 = Math.log(2);

  private MedianSurvival() {}

  /** The constant rate with that median: {@code ln 2 / median}, per the median's unit of time. */
  public static double toRate(double median) {
    return Domain.isPositive(median) ? LN2 / median : Double.NaN;
  }

  /** The median at a constant rate: {@code ln 2 / rate}, for a rate above 0. */
  public static double ofRate(double rate) {
    return toRate(rate);
  }

  /** Hazard ratio of treated against control: {@code control / treated}. */
  public static double hazardRatio(double control, double treated) {
    return toRate(treated) / toRate(control);
  }
}
