package weighhouse.rules.check.ratio;

import java.util.EnumSet;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;

/** Which quantities are ratios, whose uncertainty is close to normal on the log scale only. */
public final class Ratios {
  private static final Set<Kind> RATIOS =
      EnumSet.of(
          Kind.HAZARD_RATIO,
          Kind.RATE_RATIO,
          Kind.RISK_RATIO,
          Kind.ODDS_RATIO,
          Kind.MORTALITY_RATIO,
          Kind.TIME_RATIO,
          Kind.RELATIVE_EFFECT);
  private static final Set<Kind> LOGS =
      EnumSet.of(
          Kind.LOG_HAZARD_RATIO,
          Kind.LOG_RATE_RATIO,
          Kind.LOG_RISK_RATIO,
          Kind.LOG_ODDS_RATIO,
          Kind.COEFFICIENT);

  private Ratios() {}

  /** A ratio, a limit of one or a draw of one; no standard error. */
  public static boolean isRatio(Quantity quantity) {
    return RATIOS.contains(quantity.kind()) && quantity.role() != Role.STANDARD_ERROR;
  }

  /** The ratio itself. */
  public static boolean isEstimate(Quantity quantity) {
    return RATIOS.contains(quantity.kind()) && quantity.role() == Role.ESTIMATE;
  }

  /** A limit of a ratio. */
  public static boolean isLimit(Quantity quantity) {
    return isRatio(quantity)
        && (quantity.role() == Role.LOWER_LIMIT || quantity.role() == Role.UPPER_LIMIT);
  }

  /** A log ratio, whichever figure of it. */
  public static boolean isLog(Quantity quantity) {
    return LOGS.contains(quantity.kind());
  }

  /** A standard error of whatever. */
  public static boolean isStandardError(Quantity quantity) {
    return quantity.kind() == Kind.STANDARD_ERROR || quantity.role() == Role.STANDARD_ERROR;
  }
}
