package weighhouse.quantity;

import java.util.Locale;

/**
 * What a number is. The text of a kind is its name in lower case with spaces, as rule files and the
 * vocabulary write it.
 */
public enum Kind {
  PROBABILITY,
  RATE,
  CUMULATIVE_HAZARD,
  SURVIVAL,
  ODDS,
  /** A share of people or of a whole that is no event probability. */
  PROPORTION,

  HAZARD_RATIO,
  RATE_RATIO,
  RISK_RATIO,
  ODDS_RATIO,
  MORTALITY_RATIO,
  /** Acceleration factor. */
  TIME_RATIO,
  /** A relative effect whose scale the workbook does not tell. */
  RELATIVE_EFFECT,
  /** One minus a hazard, rate or mortality ratio. */
  HAZARD_REDUCTION,
  /** One minus a risk ratio. */
  RISK_REDUCTION,
  /** One minus a relative effect of unknown scale. */
  RELATIVE_REDUCTION,
  LOG_HAZARD_RATIO,
  LOG_RATE_RATIO,
  LOG_RISK_RATIO,
  LOG_ODDS_RATIO,
  /** Logarithm of a ratio of unknown scale, or a regression coefficient. */
  COEFFICIENT,

  CURVE_SHAPE,
  CURVE_SCALE,
  CURVE_RATE,

  TIME,
  /** Mean or median time to an event. */
  SURVIVAL_TIME,
  AGE,
  CYCLE_LENGTH,
  CYCLES_PER_YEAR,
  COUNT,
  OCCUPANCY,

  COST,
  UTILITY,
  LIFE_YEARS,
  QALY,
  ICER,
  NET_BENEFIT,
  THRESHOLD,
  DISCOUNT_RATE,
  DISCOUNT_FACTOR,
  /** Interest, growth, exchange, tax and other rates of no event. */
  OTHER_RATE,
  /** Ratio of costs, prices, utilities: relative, but of no event. */
  OTHER_RATIO,
  STANDARD_ERROR,
  SWITCH,
  UNKNOWN;

  /** The kind's name as rule files write it: {@code hazard ratio}. */
  public String text() {
    return name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
