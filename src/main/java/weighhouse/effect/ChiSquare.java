package weighhouse.effect;

import org.apache.commons.math3.special.Gamma;

/** The chi-square distribution. */
public final class ChiSquare {
  private static final double PRECISION = 1e-15;
  private static final int MOST_TERMS = 100_000;

  private ChiSquare() {}

  /**
   * Probability above a statistic: the P value of a test.
   *
   * @param statistic at least 0; NaN below
   * @param degreesOfFreedom above 0
   */
  public static double upperTail(double statistic, double degreesOfFreedom) {
    return Domain.isNonNegative(statistic)
        ? Gamma.regularizedGammaQ(degreesOfFreedom / 2, statistic / 2, PRECISION, MOST_TERMS)
        : Double.NaN;
  }
}
