package weighhouse.effect.estimate;

import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * Inverse-variance pooling of ratios on the log scale. Lists of fewer than one estimate throw
 * {@link IllegalArgumentException}; a standard error of 0 gives NaN.
 *
 * <p>Sources: colditz-1994 and tsd-2 (use); DerSimonian and Laird, Control Clin Trials
 * 1986;7:177-188 (from memory); restricted likelihood by Fisher scoring, common practice.
 */
public final class Pooling {
  private static final int MOST_STEPS = 1000;
  private static final double ENOUGH = 1e-14;

  private Pooling() {}

  /**
   * A pooled ratio.
   *
   * @param estimate the pooled log ratio
   * @param betweenTrials variance between trials, tau squared; 0 under a common effect
   * @param heterogeneity Cochran's Q, chi-square with one degree of freedom less than trials
   */
  public record Pooled(RatioEstimate estimate, double betweenTrials, double heterogeneity) {}

  /** Under one common effect: weights {@code 1/se^2}. */
  public static Pooled commonEffect(List<RatioEstimate> trials) {
    return pooled(trials, 0);
  }

  /** Random effects with the moment estimate of DerSimonian and Laird. */
  public static Pooled derSimonianLaird(List<RatioEstimate> trials) {
    Moments common = new Moments(trials, 0);
    double excess = common.heterogeneity() - (trials.size() - 1);
    double scale = common.weights - common.weights2 / common.weights;
    return pooled(trials, trials.size() > 1 ? Math.max(0, excess / scale) : 0);
  }

  /**
   * Random effects with the restricted maximum likelihood estimate, to 1e-14 absolute in tau
   * squared.
   */
  public static Pooled restrictedLikelihood(List<RatioEstimate> trials) {
    double tau2 = derSimonianLaird(trials).betweenTrials();
    for (int step = 0; step < MOST_STEPS && trials.size() > 1; step++) {
      double next = Math.max(0, tau2 + new Moments(trials, tau2).scoringStep());
      boolean settled = Math.abs(next - tau2) < ENOUGH;
      tau2 = next;
      if (settled) {
        break;
      }
    }
    return pooled(trials, tau2);
  }

  private static Pooled pooled(List<RatioEstimate> trials, double tau2) {
    Moments moments = new Moments(trials, tau2);
    RatioEstimate estimate = new RatioEstimate(moments.mean, 1 / Math.sqrt(moments.weights));
    return new Pooled(estimate, tau2, new Moments(trials, 0).heterogeneity());
  }

  /** Weighted sums at one value of tau squared. */
  private static final class Moments {
    private final List<RatioEstimate> trials;
    private final double tau2;
    private final double weights;
    private final double weights2;
    private final double mean;

    Moments(List<RatioEstimate> trials, double tau2) {
      if (trials.isEmpty()) {
        throw new IllegalArgumentException("Nothing to pool: the list of estimates is empty");
      }
      this.trials = trials;
      this.tau2 = tau2;
      weights = sum(w -> w);
      weights2 = sum(w -> w * w);
      mean = trials.stream().mapToDouble(t -> weight(t) * t.log()).sum() / weights;
    }

    private double weight(RatioEstimate trial) {
      return 1 / (trial.variance() + tau2);
    }

    private double sum(DoubleUnaryOperator ofWeight) {
      return trials.stream().mapToDouble(t -> ofWeight.applyAsDouble(weight(t))).sum();
    }

    private double squares(int power) {
      return trials.stream()
          .mapToDouble(t -> Math.pow(weight(t), power) * Math.pow(t.log() - mean, 2))
          .sum();
    }

    double heterogeneity() {
      return squares(1);
    }

    /** {@code (y'PPy - tr P) / tr PP} with P the projection of the weights. */
    double scoringStep() {
      double trace = weights - weights2 / weights;
      double share = weights2 / weights;
      double traceOfSquare = weights2 - 2 * sum(w -> w * w * w) / weights + share * share;
      return (squares(2) - trace) / traceOfSquare;
    }
  }
}
