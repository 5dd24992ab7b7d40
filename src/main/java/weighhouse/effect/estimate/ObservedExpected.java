package weighhouse.effect.estimate;

import java.util.List;
import weighhouse.effect.StandardNormal;

/**
 * Observed less expected events of one arm and the variance of the difference, as log-rank tests
 * and two-by-two tables give them. Their ratio estimates a log hazard or odds ratio near 1.
 *
 * <p>Sources: tierney-2007, pignon-2000 (use); Yusuf et al. 1985 for the one-step estimate (from
 * memory).
 *
 * @param difference observed less expected events
 * @param variance hypergeometric variance, above 0
 */
public record ObservedExpected(double difference, double variance) {

  /** Behind a published ratio and its variance V. */
  public static ObservedExpected ofRatio(double ratio, double variance) {
    return new ObservedExpected(Math.log(ratio) * variance, variance);
  }

  /** Over all trials: both parts add. */
  public static ObservedExpected sum(List<ObservedExpected> trials) {
    return new ObservedExpected(
        trials.stream().mapToDouble(ObservedExpected::difference).sum(),
        trials.stream().mapToDouble(ObservedExpected::variance).sum());
  }

  /** Log ratio {@code (O - E) / V} with standard error {@code 1 / sqrt(V)}. */
  public RatioEstimate estimate() {
    return new RatioEstimate(difference / variance, 1 / Math.sqrt(variance));
  }

  /** Chi-square statistic with one degree of freedom: {@code (O - E)^2 / V}. */
  public double chiSquare() {
    return difference * difference / variance;
  }

  /** P value of the chi-square statistic. */
  public double p() {
    return StandardNormal.twoSidedP(difference / Math.sqrt(variance));
  }
}
