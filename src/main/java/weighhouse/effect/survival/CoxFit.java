package weighhouse.effect.survival;

import java.util.List;
import weighhouse.effect.ChiSquare;
import weighhouse.effect.estimate.RatioEstimate;

/**
 * A fitted Cox regression.
 *
 * @param ties how ties were handled
 * @param hazardRatios one for each covariate: log hazard ratio per unit, and its standard error
 *     from the observed information
 * @param logLikelihoodNull log partial likelihood with all coefficients 0
 * @param logLikelihood at the estimate
 */
public record CoxFit(
    Ties ties, List<RatioEstimate> hazardRatios, double logLikelihoodNull, double logLikelihood) {

  /** Likelihood-ratio statistic, chi-square with as many degrees of freedom as covariates. */
  public double likelihoodRatio() {
    return 2 * (logLikelihood - logLikelihoodNull);
  }

  /** P value of the likelihood-ratio test. */
  public double p() {
    return ChiSquare.upperTail(likelihoodRatio(), hazardRatios.size());
  }

  double[] coefficients() {
    return hazardRatios.stream().mapToDouble(RatioEstimate::log).toArray();
  }
}
