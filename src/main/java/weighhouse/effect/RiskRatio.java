package weighhouse.effect;

/**
 * Risk ratios, which belong to one baseline risk and one horizon.
 *
 * <p>Arguments outside their domain give NaN. Sources: symons-moore-2002, zhang-yu-1998.
 */
public final class RiskRatio {
  private RiskRatio() {}

  /**
   * The hazard ratio that a risk ratio amounts to: {@code ln(1 - RR*p0) / ln(1 - p0)}.
   *
   * @param riskRatio at least 0
   * @param p0 baseline risk over the ratio's horizon, in (0, 1)
   * @return NaN where {@code RR*p0} exceeds 1
   */
  public static double toHazardRatio(double riskRatio, double p0) {
    return Scale.HAZARD.ratio(Probability.scaleRisk(p0, riskRatio), p0);
  }

  /**
   * The risk ratio that a constant hazard ratio gives: {@code (1 - (1 - p0)^HR) / p0}.
   *
   * @param hazardRatio at least 0
   * @param p0 baseline risk over the horizon asked about, in (0, 1]
   */
  public static double ofHazardRatio(double hazardRatio, double p0) {
    return Scale.RISK.ratio(Probability.scaleHazard(p0, hazardRatio), p0);
  }

  /**
   * The risk ratio that a hazard ratio suggests for a common outcome whose baseline risk is not
   * known: {@code (1 - 0.5^sqrt(HR)) / (1 - 0.5^sqrt(1/HR))}. An approximation (VanderWeele,
   * Biometrics 2020;76:746; from memory, confirmed by arithmetic only).
   *
   * @param hazardRatio above 0
   */
  public static double ofHazardRatioForCommonOutcome(double hazardRatio) {
    if (!Domain.isPositive(hazardRatio)) {
      return Double.NaN;
    }
    double root = Math.sqrt(hazardRatio);
    return Probability.scaleHazard(0.5, root) / Probability.scaleHazard(0.5, 1 / root);
  }

  /**
   * The risk ratio from an odds ratio: {@code OR / (1 - p0 + p0*OR)} (zhang-yu-1998). For an odds
   * ratio adjusted for covariates it is biased (mcnutt-2003).
   *
   * @param oddsRatio at least 0
   * @param p0 baseline risk, in [0, 1]
   */
  public static double ofOddsRatio(double oddsRatio, double p0) {
    return Domain.isProbability(p0) && Domain.isNonNegative(oddsRatio)
        ? oddsRatio / (1 - p0 + p0 * oddsRatio)
        : Double.NaN;
  }

  /**
   * A risk ratio put on a rate: {@code rate * ln(1 - RR*p0) / ln(1 - p0)}.
   *
   * @param rate at least 0
   * @param riskRatio at least 0
   * @param p0 baseline risk over the ratio's horizon, in (0, 1)
   */
  public static double applyToRate(double rate, double riskRatio, double p0) {
    return Domain.isNonNegative(rate) ? rate * toHazardRatio(riskRatio, p0) : Double.NaN;
  }

  /**
   * The risk ratio over another horizon, both hazards being constant in proportion.
   *
   * @param riskRatio over {@code from}
   * @param p0 baseline risk over {@code from}, in (0, 1)
   * @param from the ratio's horizon, above 0
   * @param to the horizon of the result, above 0
   */
  public static double overHorizon(double riskRatio, double p0, double from, double to) {
    double hazardRatio = toHazardRatio(riskRatio, p0);
    return ofHazardRatio(hazardRatio, Probability.rescale(p0, from, to));
  }
}
