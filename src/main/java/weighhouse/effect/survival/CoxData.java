package weighhouse.effect.survival;

import java.util.Arrays;

/** People's times with their covariates. Immutable. */
public final class CoxData {
  private final SurvivalTimes times;
  private final double[][] covariates;

  private CoxData(SurvivalTimes times, double[][] covariates) {
    this.times = times;
    this.covariates = covariates;
  }

  /**
   * People with covariates.
   *
   * @param covariates a row for each person, all of one length above 0, finite
   */
  public static CoxData of(SurvivalTimes times, double[][] covariates) {
    if (covariates.length != times.size() || covariates.length == 0) {
      throw new IllegalArgumentException(
          times.size() + " people need as many rows of covariates, at least one");
    }
    int count = covariates[0].length;
    boolean sound =
        Arrays.stream(covariates)
            .allMatch(row -> row.length == count && Arrays.stream(row).allMatch(Double::isFinite));
    if (count == 0 || !sound) {
      throw new IllegalArgumentException("Covariates must be finite, as many for each person");
    }
    return new CoxData(times, centred(covariates));
  }

  /** Two arms, with one covariate: 0 for control, 1 for treated. */
  public static CoxData ofArms(SurvivalTimes control, SurvivalTimes treated) {
    SurvivalTimes all = control.with(treated);
    double[][] arm = new double[all.size()][1];
    for (int i = control.size(); i < all.size(); i++) {
      arm[i][0] = 1;
    }
    return of(all, arm);
  }

  public SurvivalTimes times() {
    return times;
  }

  /** Number of covariates. */
  public int covariates() {
    return covariates[0].length;
  }

  /** A person's covariate less its mean, which leaves the partial likelihood as it is. */
  double covariate(int person, int index) {
    return covariates[person][index];
  }

  /** Keeps exponentials of covariates far from 0 within range. */
  private static double[][] centred(double[][] covariates) {
    double[][] centred = Arrays.stream(covariates).map(double[]::clone).toArray(double[][]::new);
    for (int j = 0; j < covariates[0].length; j++) {
      int column = j;
      double mean = Arrays.stream(covariates).mapToDouble(row -> row[column]).average().orElse(0);
      Arrays.stream(centred).forEach(row -> row[column] -= mean);
    }
    return centred;
  }
}
