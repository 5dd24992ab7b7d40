package weighhouse.effect.estimate;

import weighhouse.effect.StandardNormal;

/**
 * An estimated ratio on the log scale. Multipliers z of the standard error are the caller's: {@code
 * StandardNormal.multiplier(0.95)}, or 1.96 where a paper's arithmetic is followed. Numbers without
 * a logarithm give NaN.
 *
 * <p>Sources: parmar-1998, tierney-2007, altman-bland-2003, bucher-1997.
 *
 * @param log natural logarithm of the ratio
 * @param standardError of that logarithm, at least 0
 */
public record RatioEstimate(double log, double standardError) {

  /**
   * From a ratio and its interval: {@code se = (ln upper - ln lower) / (2z)}.
   *
   * @param z multiplier that made the interval
   */
  public static RatioEstimate ofInterval(double ratio, double lower, double upper, double z) {
    return new RatioEstimate(Math.log(ratio), standardError(lower, upper, z));
  }

  /** From a ratio and the size of its z statistic: {@code se = |ln ratio| / z}. */
  public static RatioEstimate ofStatistic(double ratio, double z) {
    double log = Math.log(ratio);
    return new RatioEstimate(log, Math.abs(log) / Math.abs(z));
  }

  /** Standard error of the log ratio behind an interval: {@code (ln upper - ln lower) / (2z)}. */
  public static double standardError(double lower, double upper, double z) {
    return (Math.log(upper) - Math.log(lower)) / (2 * z);
  }

  public double ratio() {
    return Math.exp(log);
  }

  public double variance() {
    return standardError * standardError;
  }

  /** Lower limit {@code exp(log - z * se)}. */
  public double lower(double z) {
    return Math.exp(log - z * standardError);
  }

  /** Upper limit {@code exp(log + z * se)}. */
  public double upper(double z) {
    return Math.exp(log + z * standardError);
  }

  /** z statistic against no effect. */
  public double statistic() {
    return log / standardError;
  }

  /** Two-sided P value against no effect. */
  public double p() {
    return StandardNormal.twoSidedP(statistic());
  }

  /** B against A from A against B. Its limits are 1/upper and 1/lower. */
  public RatioEstimate reciprocal() {
    return new RatioEstimate(-log, standardError);
  }

  /**
   * Indirect comparison of A with B through a common comparator C, this being A against C: logs
   * subtract, variances add (bucher-1997). Also the test of two independent estimates against each
   * other (altman-bland-2003).
   *
   * @param other B against C, from other patients
   */
  public RatioEstimate against(RatioEstimate other) {
    return new RatioEstimate(log - other.log, Math.hypot(standardError, other.standardError));
  }

  /** Mean of the log-normal distribution with these parameters: {@code exp(log + se^2/2)}. */
  public double meanOfDraws() {
    return Math.exp(log + variance() / 2);
  }

  /** Quantile of that distribution, p in [0, 1]. */
  public double quantile(double p) {
    return Math.exp(log + standardError * StandardNormal.quantile(p));
  }
}
