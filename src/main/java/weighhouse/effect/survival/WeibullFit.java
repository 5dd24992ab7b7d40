package weighhouse.effect.survival;

import java.util.Optional;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import weighhouse.effect.curve.Weibull;

/**
 * Two Weibull curves of one shape, fitted by maximum likelihood: for a given shape k the rates are
 * {@code d / sum(t^k)} in each arm, and k solves {@code D/k + sum of ln t over events = sum over
 * arms of d * sum(t^k ln t) / sum(t^k)}. Exact to about 1e-12 relative.
 *
 * <p>Source: collett, for both forms.
 *
 * @param control curve of the control arm
 * @param treated curve of the treated arm, of the same shape
 * @param logLikelihood on the scale of time
 */
public record WeibullFit(Weibull control, Weibull treated, double logLikelihood) {
  private static final double LEAST_SHAPE = 1e-3;
  private static final double LARGEST_SHAPE = 1e3;

  /**
   * Fits both arms.
   *
   * @return empty where an arm has no events, a time is 0, or no shape between 0.001 and 1000 fits
   */
  public static Optional<WeibullFit> of(SurvivalTimes control, SurvivalTimes treated) {
    Arm arm0 = new Arm(control);
    Arm arm1 = new Arm(treated);
    if (!arm0.canFit() || !arm1.canFit()) {
      return Optional.empty();
    }
    UnivariateFunction slope = k -> arm0.slope(k) + arm1.slope(k);
    if (!(slope.value(LEAST_SHAPE) > 0 && slope.value(LARGEST_SHAPE) < 0)) {
      return Optional.empty();
    }
    double shape = new BrentSolver(1e-14, 1e-15).solve(1000, slope, LEAST_SHAPE, LARGEST_SHAPE);
    double logLikelihood = arm0.logLikelihood(shape) + arm1.logLikelihood(shape);
    return Optional.of(new WeibullFit(arm0.curve(shape), arm1.curve(shape), logLikelihood));
  }

  public double shape() {
    return control.shape();
  }

  /** Time ratio (acceleration factor) of treated against control. */
  public double timeRatio() {
    return treated.scale() / control.scale();
  }

  /** Hazard ratio of treated against control. */
  public double hazardRatio() {
    return control.hazardRatioOfTimeRatio(timeRatio());
  }

  /** Sums over one arm, times in units of the longest so that powers stay within range. */
  private static final class Arm {
    private final SurvivalTimes people;
    private final double unit;

    Arm(SurvivalTimes people) {
      this.people = people;
      double longest = 0;
      for (int i = 0; i < people.size(); i++) {
        longest = Math.max(longest, people.time(i));
      }
      this.unit = longest;
    }

    boolean canFit() {
      boolean positive = people.size() > 0 && unit > 0;
      for (int i = 0; i < people.size(); i++) {
        positive &= people.time(i) > 0;
      }
      return positive && people.events() > 0;
    }

    double slope(double shape) {
      double powers = 0;
      double weighted = 0;
      double logs = 0;
      for (int i = 0; i < people.size(); i++) {
        double log = Math.log(people.time(i) / unit);
        double power = Math.exp(shape * log);
        powers += power;
        weighted += power * log;
        logs += people.event(i) ? log : 0;
      }
      return people.events() / shape + logs - people.events() * weighted / powers;
    }

    Weibull curve(double shape) {
      double powers = 0;
      for (int i = 0; i < people.size(); i++) {
        powers += Math.pow(people.time(i) / unit, shape);
      }
      return new Weibull(shape, unit * Math.pow(powers / people.events(), 1 / shape));
    }

    double logLikelihood(double shape) {
      Weibull curve = curve(shape);
      double sum = 0;
      for (int i = 0; i < people.size(); i++) {
        double time = people.time(i);
        sum += (people.event(i) ? Math.log(curve.hazard(time)) : 0) - curve.cumulativeHazard(time);
      }
      return sum;
    }
  }
}
