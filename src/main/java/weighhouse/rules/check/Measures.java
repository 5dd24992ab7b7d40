package weighhouse.rules.check;

import java.util.EnumSet;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;

/** Kinds of effect measures and of what they act on. */
public final class Measures {
  private static final Set<Kind> RATIOS =
      EnumSet.of(
          Kind.HAZARD_RATIO,
          Kind.RATE_RATIO,
          Kind.RISK_RATIO,
          Kind.ODDS_RATIO,
          Kind.MORTALITY_RATIO,
          Kind.TIME_RATIO,
          Kind.RELATIVE_EFFECT);
  private static final Set<Kind> DIFFERENCES =
      EnumSet.of(
          Kind.HAZARD_REDUCTION,
          Kind.RISK_REDUCTION,
          Kind.RELATIVE_REDUCTION,
          Kind.LOG_HAZARD_RATIO,
          Kind.LOG_RATE_RATIO,
          Kind.LOG_RISK_RATIO,
          Kind.LOG_ODDS_RATIO);
  private static final Set<Kind> EVENTS =
      EnumSet.of(Kind.PROBABILITY, Kind.RATE, Kind.CUMULATIVE_HAZARD, Kind.SURVIVAL, Kind.ODDS);

  private Measures() {}

  /** Whether it is a ratio, a reduction or the logarithm of a ratio. */
  public static boolean isMeasure(Kind kind) {
    return RATIOS.contains(kind) || DIFFERENCES.contains(kind);
  }

  /** Whether it is a ratio as such. */
  public static boolean isRatio(Kind kind) {
    return RATIOS.contains(kind);
  }

  /** Whether it is the estimate (not a limit, a standard error, a draw) of a measure. */
  public static boolean isEstimate(Quantity quantity) {
    return quantity.role() == Role.ESTIMATE && isMeasure(quantity.kind());
  }

  /** Whether it says how often something happens. */
  public static boolean isEvent(Kind kind) {
    return EVENTS.contains(kind);
  }

  /** The measure's value that changes nothing: 1 of ratios, 0 of reductions and logarithms. */
  public static double neutral(Kind kind) {
    return RATIOS.contains(kind) ? 1 : 0;
  }
}
