package weighhouse.generator.model;

/**
 * What the workbook holds about an event, and how it becomes a probability per cycle (or a survival
 * function). In templates <code>{cyc}</code> is the cycle in years, <code>{xcyc}</code> multiplies
 * by it.
 */
public enum Basis {
  ANNUAL_RATE("1-EXP(-{base}{xcyc})"),
  RATE_PER_1000("1-EXP(-{base}/1000{xcyc})"),
  ANNUAL_PROBABILITY("1-(1-{base})^{cyc}"),
  FIVE_YEAR_PROBABILITY("1-(1-{base})^({cyc}/5)"),
  MONTHLY_PROBABILITY("1-(1-{base})^(12*{cyc})"),
  CYCLE_PROBABILITY("{base}"),
  MEDIAN_YEARS("1-EXP(-LN(2)/{base}{xcyc})"),
  /** Annual probabilities of death by age, looked up cycle by cycle. */
  LIFE_TABLE("1-(1-{qx})^{cyc}"),
  /** Cumulative hazard lambda t^gamma, turned into a probability cycle by cycle. */
  WEIBULL_HAZARD("1-EXP({lambda}*({t0}^{gamma}-{t}^{gamma}))"),
  /** S = exp(-lambda t^gamma). */
  WEIBULL_RATE("EXP(-{lambda}*{t}^{gamma})"),
  /** S = exp(-(t/scale)^shape). */
  WEIBULL_SCALE("EXP(-(({t}/{scale})^{shape}))"),
  EXPONENTIAL("EXP(-{lambda}*{t})"),
  GOMPERTZ("EXP(-({lambda}/{gamma})*(EXP({gamma}*{t})-1))"),
  LOG_NORMAL("IF({t}=0,1,1-NORMSDIST((LN({t})-{mu})/{sigma}))"),
  LOG_LOGISTIC("1/(1+({t}/{scale})^{shape})");

  private final String usual;

  Basis(String usual) {
    this.usual = usual;
  }

  /** The usual formula of the quantity without effect. */
  public String usual() {
    return usual;
  }

  /** Whether it changes from cycle to cycle, so that it is laid out along the trace. */
  public boolean alongCycles() {
    return compareTo(LIFE_TABLE) >= 0;
  }

  /** Whether it is a survival function rather than a transition probability. */
  public boolean isCurve() {
    return compareTo(WEIBULL_RATE) >= 0;
  }

  /** Whether it says something about a year. */
  public boolean isAnnual() {
    return this == ANNUAL_RATE || this == RATE_PER_1000 || this == ANNUAL_PROBABILITY;
  }
}
