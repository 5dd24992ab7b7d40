package weighhouse.effect;

/**
 * Odds ratios, which belong to one horizon. Arguments outside their domain give NaN.
 *
 * <p>Source: zhang-yu-1998, bland-altman-2000.
 */
public final class OddsRatio {
  private OddsRatio() {}

  /**
   * The odds ratio between two probabilities over one horizon: {@code [p1/(1-p1)] / [p0/(1-p0)]}.
   *
   * @param p1 with the effect, in [0, 1]
   * @param p0 without it, in (0, 1)
   */
  public static double between(double p1, double p0) {
    return Scale.ODDS.ratio(p1, p0);
  }

  /**
   * The odds ratio that a risk ratio amounts to: {@code RR * (1 - p0) / (1 - RR*p0)}.
   *
   * @param riskRatio at least 0
   * @param p0 baseline risk, in (0, 1)
   * @return NaN where {@code RR*p0} exceeds 1
   */
  public static double ofRiskRatio(double riskRatio, double p0) {
    return between(Probability.scaleRisk(p0, riskRatio), p0);
  }

  /**
   * The hazard ratio that an odds ratio amounts to over its horizon.
   *
   * @param oddsRatio at least 0
   * @param p0 baseline risk over the horizon, in (0, 1)
   */
  public static double toHazardRatio(double oddsRatio, double p0) {
    return Scale.HAZARD.ratio(Probability.scaleOdds(p0, oddsRatio), p0);
  }
}
