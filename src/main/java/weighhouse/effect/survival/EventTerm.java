package weighhouse.effect.survival;

/** What the events at one time add to the log partial likelihood, its slope and its curvature. */
final class EventTerm {
  private final double time;
  private double logLikelihood;
  private final double[] score;
  private final double[][] information;

  EventTerm(double time, int covariates) {
    this.time = time;
    score = new double[covariates];
    information = new double[covariates][covariates];
  }

  double time() {
    return time;
  }

  double logLikelihood() {
    return logLikelihood;
  }

  double score(int j) {
    return score[j];
  }

  double information(int j, int k) {
    return information[j][k];
  }

  void addPerson(CoxData data, int person, double logWeight) {
    logLikelihood += logWeight;
    for (int j = 0; j < score.length; j++) {
      score[j] += data.covariate(person, j);
    }
  }

  /** The people at risk for one of the events: all, less a share of those with the event. */
  void addRisk(RiskSum all, RiskSum tied, double share) {
    double weight = all.weight() - share * tied.weight();
    logLikelihood -= Math.log(weight);
    for (int j = 0; j < score.length; j++) {
      double mean = (all.first(j) - share * tied.first(j)) / weight;
      score[j] -= mean;
      for (int k = 0; k <= j; k++) {
        double other = (all.first(k) - share * tied.first(k)) / weight;
        double product = (all.second(j, k) - share * tied.second(j, k)) / weight;
        information[j][k] += product - mean * other;
        information[k][j] = information[j][k];
      }
    }
  }
}
