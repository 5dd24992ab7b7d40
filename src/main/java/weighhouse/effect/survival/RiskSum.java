package weighhouse.effect.survival;

import java.util.Arrays;

/** Weighted sums over people: of the weights, of covariates, of products of two covariates. */
final class RiskSum {
  private double weight;
  private final double[] first;
  private final double[][] second;

  RiskSum(int covariates) {
    first = new double[covariates];
    second = new double[covariates][covariates];
  }

  void add(CoxData data, int person, double personWeight) {
    weight += personWeight;
    for (int j = 0; j < first.length; j++) {
      double weighted = personWeight * data.covariate(person, j);
      first[j] += weighted;
      for (int k = 0; k <= j; k++) {
        second[j][k] += weighted * data.covariate(person, k);
      }
    }
  }

  void add(RiskSum other) {
    weight += other.weight;
    for (int j = 0; j < first.length; j++) {
      first[j] += other.first[j];
      for (int k = 0; k <= j; k++) {
        second[j][k] += other.second[j][k];
      }
    }
  }

  void clear() {
    weight = 0;
    Arrays.fill(first, 0);
    Arrays.stream(second).forEach(row -> Arrays.fill(row, 0));
  }

  double weight() {
    return weight;
  }

  double first(int j) {
    return first[j];
  }

  /** For j not below k. */
  double second(int j, int k) {
    return second[j][k];
  }
}
