package weighhouse.effect.survival;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.util.CombinatoricsUtils;
import weighhouse.effect.estimate.RatioEstimate;

/**
 * Exact treatments of ties between two arms, to recognise published hazard ratios that were made
 * so. The estimate is exact to about 1e-7, its standard error to about 1e-5 relative. Hazard ratios
 * beyond exp(10) either way, such as those of an arm without events, come out as the bound.
 *
 * <p>Source: therneau-grambsch-2000 for the two likelihoods (from memory).
 */
public enum ExactTies {
  /** Time is discrete: the chance of just these among all sets of so many people at risk. */
  DISCRETE {
    @Override
    double logTerm(double beta, Tied tied) {
      double sum = 0;
      int events = tied.events0 + tied.events1;
      for (int j = Math.max(0, events - tied.risk0); j <= Math.min(events, tied.risk1); j++) {
        double ways =
            CombinatoricsUtils.binomialCoefficientLog(tied.risk1, j)
                + CombinatoricsUtils.binomialCoefficientLog(tied.risk0, events - j);
        sum += Math.exp(ways + (j - tied.events1) * beta);
      }
      return -Math.log(sum);
    }
  },
  /** Time is continuous and ties are rounding: all orders of the tied events are possible. */
  MARGINAL {
    @Override
    double logTerm(double beta, Tied tied) {
      double theta = Math.exp(beta);
      double rest = tied.risk0 - tied.events0 + theta * (tied.risk1 - tied.events1);
      double sum = 0;
      for (int a = 0; a <= tied.events1; a++) {
        for (int b = 0; b <= tied.events0; b++) {
          double ways =
              CombinatoricsUtils.binomialCoefficientDouble(tied.events1, a)
                  * CombinatoricsUtils.binomialCoefficientDouble(tied.events0, b);
          double weight = a * theta + b;
          double chance = weight == 0 ? 1 : rest / (rest + weight);
          sum += ((a + b) % 2 == 0 ? 1 : -1) * ways * chance;
        }
      }
      return Math.log(sum);
    }
  };

  private static final double WIDEST = 10;
  private static final double STEP = 1e-3;

  /** The people of two arms at one event time. */
  private record Tied(int risk0, int risk1, int events0, int events1) {}

  abstract double logTerm(double beta, Tied tied);

  /** Hazard ratio of treated against control. */
  public RatioEstimate hazardRatio(SurvivalTimes control, SurvivalTimes treated) {
    double beta =
        new BrentOptimizer(1e-10, 1e-12)
            .optimize(
                new MaxEval(1000),
                GoalType.MAXIMIZE,
                new SearchInterval(-WIDEST, WIDEST),
                new UnivariateObjectiveFunction(b -> value(b, control, treated)))
            .getPoint();
    double bend =
        value(beta + STEP, control, treated)
            - 2 * value(beta, control, treated)
            + value(beta - STEP, control, treated);
    return new RatioEstimate(beta, STEP / Math.sqrt(-bend));
  }

  private double value(double beta, SurvivalTimes control, SurvivalTimes treated) {
    double sum = 0;
    for (double time : control.with(treated).eventTimes()) {
      sum +=
          logTerm(
              beta,
              new Tied(
                  control.atRisk(time),
                  treated.atRisk(time),
                  control.eventsAt(time),
                  treated.eventsAt(time)));
    }
    return sum;
  }
}
