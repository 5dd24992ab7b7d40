package weighhouse.audit.probe;

import java.util.EnumSet;
import java.util.Optional;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import weighhouse.audit.ActsOn;
import weighhouse.quantity.Kind;

/**
 * How the figure in a measure's cell stands for a ratio, and the scale on which that ratio was
 * estimated.
 *
 * @param toRatio from the figure in the cell to the ratio
 * @param fromRatio from a ratio to the figure that would stand in the cell
 * @param estimatedOn the scale of the estimate
 */
record RatioLaw(DoubleUnaryOperator toRatio, DoubleUnaryOperator fromRatio, ActsOn estimatedOn) {

  private static final Set<Kind> ON_HAZARD =
      EnumSet.of(
          Kind.HAZARD_RATIO,
          Kind.RATE_RATIO,
          Kind.MORTALITY_RATIO,
          Kind.HAZARD_REDUCTION,
          Kind.LOG_HAZARD_RATIO,
          Kind.LOG_RATE_RATIO);
  private static final Set<Kind> ON_RISK =
      EnumSet.of(Kind.RISK_RATIO, Kind.RISK_REDUCTION, Kind.LOG_RISK_RATIO);
  private static final Set<Kind> ON_ODDS = EnumSet.of(Kind.ODDS_RATIO, Kind.LOG_ODDS_RATIO);
  private static final Set<Kind> REDUCTIONS =
      EnumSet.of(Kind.HAZARD_REDUCTION, Kind.RISK_REDUCTION, Kind.RELATIVE_REDUCTION);
  private static final Set<Kind> LOGS =
      EnumSet.of(
          Kind.LOG_HAZARD_RATIO, Kind.LOG_RATE_RATIO, Kind.LOG_RISK_RATIO, Kind.LOG_ODDS_RATIO);

  /** The law of a kind; empty where the kind is no effect measure. */
  static Optional<RatioLaw> of(Kind kind) {
    ActsOn scale = scale(kind);
    if (scale == ActsOn.NOTHING) {
      return Optional.empty();
    }
    if (REDUCTIONS.contains(kind)) {
      return Optional.of(new RatioLaw(v -> 1 - v, r -> 1 - r, scale));
    }
    if (LOGS.contains(kind)) {
      return Optional.of(new RatioLaw(Math::exp, Math::log, scale));
    }
    return Optional.of(new RatioLaw(v -> v, r -> r, scale));
  }

  private static ActsOn scale(Kind kind) {
    if (ON_HAZARD.contains(kind)) {
      return ActsOn.HAZARD;
    }
    if (ON_RISK.contains(kind)) {
      return ActsOn.RISK;
    }
    if (ON_ODDS.contains(kind)) {
      return ActsOn.ODDS;
    }
    if (kind == Kind.TIME_RATIO) {
      return ActsOn.TIME;
    }
    return kind == Kind.RELATIVE_EFFECT || kind == Kind.RELATIVE_REDUCTION
        ? ActsOn.MIXED
        : ActsOn.NOTHING;
  }
}
