package weighhouse.effect;

/**
 * A transform of probability on which a ratio can act as a plain factor. Every scale knows how to
 * put a ratio on a probability and, the other way round, which ratio turned one probability into
 * another.
 */
public enum Scale {
  /** Cumulative hazard, {@code -ln(1 - p)}: hazard, rate and mortality ratios. */
  HAZARD {
    @Override
    public double of(double probability) {
      return Probability.toCumulativeHazard(probability);
    }

    @Override
    public double apply(double probability, double ratio) {
      return Probability.scaleHazard(probability, ratio);
    }
  },
  /** The probability itself: risk ratios. */
  RISK {
    @Override
    public double of(double probability) {
      return Domain.isProbability(probability) ? probability : Double.NaN;
    }

    @Override
    public double apply(double probability, double ratio) {
      return Probability.scaleRisk(probability, ratio);
    }
  },
  /** {@code p / (1 - p)}: odds ratios. */
  ODDS {
    @Override
    public double of(double probability) {
      return Probability.toOdds(probability);
    }

    @Override
    public double apply(double probability, double ratio) {
      return Probability.scaleOdds(probability, ratio);
    }
  },
  /** {@code 1 - p}, which is survival over the span: no measure has this law. */
  COMPLEMENT {
    @Override
    public double of(double probability) {
      return Domain.isProbability(probability) ? 1 - probability : Double.NaN;
    }

    @Override
    public double apply(double probability, double ratio) {
      return Probability.scaleComplement(probability, ratio);
    }
  };

  /** The probability on this scale; NaN outside [0, 1]. */
  public abstract double of(double probability);

  /**
   * The probability after a ratio acted on this scale.
   *
   * @param probability in [0, 1]
   * @param ratio at least 0
   * @return the new probability; on the scales RISK and COMPLEMENT it may leave [0, 1]
   */
  public abstract double apply(double probability, double ratio);

  /**
   * The ratio that turned {@code without} into {@code with} on this scale, such as {@code ln(1 - T)
   * / ln(1 - T1)} on the hazard scale.
   *
   * @return the ratio; NaN where either is outside [0, 1], or both are 0 or both infinite here
   */
  public double ratio(double with, double without) {
    return of(with) / of(without);
  }
}
