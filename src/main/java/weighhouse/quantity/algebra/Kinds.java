package weighhouse.quantity.algebra;

import java.util.EnumMap;
import java.util.EnumSet;
import java.util.Map;
import java.util.Set;
import weighhouse.quantity.Kind;

/** Kinds that arithmetic treats alike, and pairs of kinds that a function carries over. */
public final class Kinds {
  /** Relative effects on events. */
  public static final Set<Kind> RATIOS = EnumSet.range(Kind.HAZARD_RATIO, Kind.RELATIVE_EFFECT);

  public static final Set<Kind> REDUCTIONS =
      EnumSet.of(Kind.HAZARD_REDUCTION, Kind.RISK_REDUCTION, Kind.RELATIVE_REDUCTION);

  public static final Set<Kind> LOGS = EnumSet.range(Kind.LOG_HAZARD_RATIO, Kind.COEFFICIENT);

  /** What a ratio may be applied to. */
  public static final Set<Kind> RISKS =
      EnumSet.of(Kind.PROBABILITY, Kind.RATE, Kind.CUMULATIVE_HAZARD, Kind.SURVIVAL, Kind.ODDS);

  static final Set<Kind> TIMES =
      EnumSet.of(Kind.TIME, Kind.CYCLE_LENGTH, Kind.COUNT, Kind.AGE, Kind.SURVIVAL_TIME);

  /** Results and the like: whatever multiplies them, they stay. */
  static final Set<Kind> RESULTS =
      EnumSet.of(Kind.COST, Kind.QALY, Kind.LIFE_YEARS, Kind.NET_BENEFIT, Kind.ICER);

  private static final Map<Kind, Kind> LOG_OF =
      new EnumMap<>(
          Map.of(
              Kind.HAZARD_RATIO, Kind.LOG_HAZARD_RATIO,
              Kind.RATE_RATIO, Kind.LOG_RATE_RATIO,
              Kind.RISK_RATIO, Kind.LOG_RISK_RATIO,
              Kind.ODDS_RATIO, Kind.LOG_ODDS_RATIO,
              Kind.MORTALITY_RATIO, Kind.LOG_HAZARD_RATIO,
              Kind.TIME_RATIO, Kind.COEFFICIENT,
              Kind.RELATIVE_EFFECT, Kind.COEFFICIENT));

  private static final Map<Kind, Kind> RATIO_OF_LOG =
      new EnumMap<>(
          Map.of(
              Kind.LOG_HAZARD_RATIO, Kind.HAZARD_RATIO,
              Kind.LOG_RATE_RATIO, Kind.RATE_RATIO,
              Kind.LOG_RISK_RATIO, Kind.RISK_RATIO,
              Kind.LOG_ODDS_RATIO, Kind.ODDS_RATIO,
              Kind.COEFFICIENT, Kind.RELATIVE_EFFECT));

  private static final Map<Kind, Kind> REDUCTION_OF =
      new EnumMap<>(
          Map.of(
              Kind.HAZARD_RATIO, Kind.HAZARD_REDUCTION,
              Kind.RATE_RATIO, Kind.HAZARD_REDUCTION,
              Kind.MORTALITY_RATIO, Kind.HAZARD_REDUCTION,
              Kind.RISK_RATIO, Kind.RISK_REDUCTION));

  private static final Map<Kind, Kind> QUOTIENT =
      new EnumMap<>(
          Map.of(
              Kind.RATE, Kind.RATE_RATIO,
              Kind.CUMULATIVE_HAZARD, Kind.HAZARD_RATIO,
              Kind.PROBABILITY, Kind.RISK_RATIO,
              Kind.SURVIVAL, Kind.SURVIVAL,
              Kind.ODDS, Kind.ODDS_RATIO,
              Kind.COST, Kind.OTHER_RATIO,
              Kind.UTILITY, Kind.OTHER_RATIO,
              Kind.OCCUPANCY, Kind.PROPORTION));

  private Kinds() {}

  /** The kind of the logarithm of a ratio; UNKNOWN of other kinds. */
  public static Kind logOf(Kind ratio) {
    return LOG_OF.getOrDefault(ratio, Kind.UNKNOWN);
  }

  /** The kind of the exponential of a log ratio; UNKNOWN of other kinds. */
  public static Kind ratioOf(Kind log) {
    return RATIO_OF_LOG.getOrDefault(log, Kind.UNKNOWN);
  }

  /** The kind of one minus a ratio. */
  static Kind reductionOf(Kind ratio) {
    return REDUCTION_OF.getOrDefault(ratio, Kind.RELATIVE_REDUCTION);
  }

  /** The kind of one minus a reduction. */
  static Kind ratioOfReduction(Kind reduction) {
    return switch (reduction) {
      case HAZARD_REDUCTION -> Kind.HAZARD_RATIO;
      case RISK_REDUCTION -> Kind.RISK_RATIO;
      default -> Kind.RELATIVE_EFFECT;
    };
  }

  /** The kind of the quotient of two numbers of one kind. */
  static Kind quotientOf(Kind kind) {
    return QUOTIENT.getOrDefault(kind, Kind.UNKNOWN);
  }
}
