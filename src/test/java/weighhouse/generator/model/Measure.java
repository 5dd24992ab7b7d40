package weighhouse.generator.model;

/** The effect measures that an event may carry. */
public enum Measure {
  HAZARD_RATIO("hr", 0.45, 0.85),
  RATE_RATIO("irr", 0.45, 0.85),
  RISK_RATIO("rr", 0.45, 0.85),
  ODDS_RATIO("or", 0.40, 0.80),
  MORTALITY_RATIO("smr", 1.4, 2.6),
  /** Hazard ratio of the comparator against the treatment, above one. */
  INVERSE_HAZARD_RATIO("hr_inv", 1.25, 2.1),
  /** Logarithm of a hazard ratio of an adverse effect. */
  LOG_HAZARD_RATIO("ln_hr", 0.2, 0.7),
  /** Share by which the hazard falls. */
  HAZARD_REDUCTION("eff", 0.2, 0.5);

  private final String prefix;
  private final double low;
  private final double high;

  Measure(String prefix, double low, double high) {
    this.prefix = prefix;
    this.low = low;
    this.high = high;
  }

  /** How names begin. */
  public String prefix() {
    return prefix;
  }

  /** A plausible value. */
  public double draw(Dice dice) {
    return dice.between(low, high, 2);
  }

  /** Whether it is a ratio, with limits symmetric on the log scale. */
  public boolean isRatio() {
    return this != LOG_HAZARD_RATIO && this != HAZARD_REDUCTION;
  }

  /** Whether it holds for all patients against the general population, whatever their arm. */
  public boolean inBothArms() {
    return this == MORTALITY_RATIO;
  }
}
