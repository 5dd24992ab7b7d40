package weighhouse.effect;

/**
 * Probabilities of an event over some span, their conversions, and ratios put on them. Spans are in
 * any unit of time, one and the same within a call.
 *
 * <p>Arguments outside their domain give NaN. Through {@code log1p} and {@code expm1} the relative
 * error stays within a few units in the last place, for probabilities of 1e-300 too.
 *
 * <p>Sources: fleurence-hollenbeak-2007, gidwani-russell-2020.
 */
public final class Probability {
  private Probability() {}

  /**
   * Probability of at least one event at a constant rate: {@code 1 - exp(-rate * span)}.
   *
   * @param rate events per person and unit of time, at least 0
   * @param span length of time, at least 0
   */
  public static double ofRate(double rate, double span) {
    return Domain.isNonNegative(rate) && Domain.isNonNegative(span)
        ? ofCumulativeHazard(rate * span)
        : Double.NaN;
  }

  /**
   * The constant rate that gives a probability: {@code -ln(1 - p) / span}; infinite at p = 1.
   *
   * @param p probability in [0, 1] over the span
   * @param span length of time, above 0
   */
  public static double toRate(double p, double span) {
    return Domain.isPositive(span) ? toCumulativeHazard(p) / span : Double.NaN;
  }

  /** {@code 1 - exp(-H)}, for a cumulative hazard of at least 0; 1 at infinity. */
  public static double ofCumulativeHazard(double cumulativeHazard) {
    return Domain.isNonNegative(cumulativeHazard) ? -Math.expm1(-cumulativeHazard) : Double.NaN;
  }

  /** {@code -ln(1 - p)}, for p in [0, 1]; infinite at 1. */
  public static double toCumulativeHazard(double p) {
    return Domain.isProbability(p) ? Math.abs(Math.log1p(-p)) : Double.NaN;
  }

  /** {@code odds / (1 + odds)}, for odds of at least 0; 1 at infinity. */
  public static double ofOdds(double odds) {
    if (!Domain.isNonNegative(odds)) {
      return Double.NaN;
    }
    return odds > 1 ? 1 / (1 + 1 / odds) : odds / (1 + odds);
  }

  /** {@code p / (1 - p)}, for p in [0, 1]; infinite at 1. */
  public static double toOdds(double p) {
    return Domain.isProbability(p) ? p / (1 - p) : Double.NaN;
  }

  /**
   * The probability over another length of time at a constant hazard: {@code 1 - (1 -
   * p)^(to/from)}. Right for one event out of a state; not for the entries of a row with several
   * exits, nor for a matrix of three states or more (gidwani-russell-2020, chhatwal-2016).
   *
   * @param p probability in [0, 1] over {@code from}
   * @param from span of p, above 0
   * @param to span of the result, at least 0
   */
  public static double rescale(double p, double from, double to) {
    return Domain.isPositive(from) ? scaleHazard(p, to / from) : Double.NaN;
  }

  /**
   * A hazard, rate or mortality ratio put on a probability: {@code 1 - (1 - p)^ratio}. Exact for
   * any shape of the hazard, where the ratio holds throughout the span of p.
   *
   * @param p probability in [0, 1]
   * @param ratio at least 0
   */
  public static double scaleHazard(double p, double ratio) {
    if (!Domain.isProbability(p) || !Domain.isNonNegative(ratio)) {
      return Double.NaN;
    }
    // 0 * infinity has no value, but the limits do: no hazard at all gives no event.
    return ratio == 0 || p == 0 ? 0 : -Math.expm1(ratio * Math.log1p(-p));
  }

  /**
   * A risk ratio put on a probability over the ratio's own horizon: {@code p * ratio}. Not bounded:
   * the result exceeds 1 where the ratio exceeds 1/p, and the caller is to say so.
   *
   * @param p probability in [0, 1]
   * @param ratio at least 0
   */
  public static double scaleRisk(double p, double ratio) {
    return Domain.isProbability(p) && Domain.isNonNegative(ratio) ? p * ratio : Double.NaN;
  }

  /**
   * An odds ratio put on a probability over the ratio's own horizon: {@code ratio*p / (1 - p +
   * ratio*p)}.
   *
   * @param p probability in [0, 1]
   * @param ratio at least 0
   */
  public static double scaleOdds(double p, double ratio) {
    if (!Domain.isProbability(p) || !Domain.isNonNegative(ratio)) {
      return Double.NaN;
    }
    return ratio * p / (1 - p + ratio * p);
  }

  /**
   * A ratio put on the chance of no event: {@code 1 - (1 - p) * ratio}. No measure of the field has
   * this law, but workbooks do it; below 0 where the ratio exceeds 1/(1 - p).
   *
   * @param p probability in [0, 1]
   * @param ratio at least 0
   */
  public static double scaleComplement(double p, double ratio) {
    return Domain.isProbability(p) && Domain.isNonNegative(ratio)
        ? p * ratio + (1 - ratio)
        : Double.NaN;
  }

  /**
   * Probability of the event between two times for those without it at the first: {@code 1 -
   * later/earlier}.
   *
   * @param earlier survival at the first time, in (0, 1]
   * @param later survival at the second, in [0, earlier]; a later survival above the earlier gives
   *     NaN
   */
  public static double ofSurvival(double earlier, double later) {
    boolean defined = Domain.isProbability(earlier) && earlier > 0 && later >= 0;
    return defined && later <= earlier ? (earlier - later) / earlier : Double.NaN;
  }
}
