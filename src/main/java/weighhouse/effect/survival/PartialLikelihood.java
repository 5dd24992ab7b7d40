package weighhouse.effect.survival;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;

/** The log partial likelihood at one set of coefficients, event time by event time. */
final class PartialLikelihood {
  private final List<EventTerm> terms;
  private final int covariates;

  private PartialLikelihood(List<EventTerm> terms, int covariates) {
    this.terms = terms;
    this.covariates = covariates;
  }

  static PartialLikelihood at(CoxData data, Ties ties, RealVector coefficients) {
    SurvivalTimes times = data.times();
    int[] order = times.longestFirst();
    RiskSum all = new RiskSum(data.covariates());
    RiskSum tied = new RiskSum(data.covariates());
    List<EventTerm> terms = new ArrayList<>();
    int next = 0;
    while (next < order.length) {
      double time = times.time(order[next]);
      EventTerm term = new EventTerm(time, data.covariates());
      tied.clear();
      int events = 0;
      for (; next < order.length && times.time(order[next]) == time; next++) {
        int person = order[next];
        double logWeight = logWeight(data, person, coefficients);
        all.add(data, person, Math.exp(logWeight));
        if (times.event(person)) {
          events++;
          tied.add(data, person, Math.exp(logWeight));
          term.addPerson(data, person, logWeight);
        }
      }
      for (int event = 0; event < events; event++) {
        term.addRisk(all, tied, ties.share(event, events));
      }
      if (events > 0) {
        terms.add(term);
      }
    }
    return new PartialLikelihood(terms, data.covariates());
  }

  private static double logWeight(CoxData data, int person, RealVector coefficients) {
    double sum = 0;
    for (int j = 0; j < data.covariates(); j++) {
      sum += coefficients.getEntry(j) * data.covariate(person, j);
    }
    return sum;
  }

  /** One term for each distinct event time, the latest first. */
  List<EventTerm> terms() {
    return terms;
  }

  double value() {
    return terms.stream().mapToDouble(EventTerm::logLikelihood).sum();
  }

  /** Slope, each event time weighted. */
  RealVector score(double[] weights) {
    RealVector sum = new ArrayRealVector(covariates);
    for (int i = 0; i < weights.length; i++) {
      for (int j = 0; j < covariates; j++) {
        sum.addToEntry(j, weights[i] * terms.get(i).score(j));
      }
    }
    return sum;
  }

  /** Observed information, each event time weighted. */
  RealMatrix information(double[] weights) {
    RealMatrix sum = new Array2DRowRealMatrix(covariates, covariates);
    for (int i = 0; i < weights.length; i++) {
      for (int j = 0; j < covariates; j++) {
        for (int k = 0; k < covariates; k++) {
          sum.addToEntry(j, k, weights[i] * terms.get(i).information(j, k));
        }
      }
    }
    return sum;
  }

  double[] ones() {
    double[] ones = new double[terms.size()];
    Arrays.fill(ones, 1);
    return ones;
  }
}
