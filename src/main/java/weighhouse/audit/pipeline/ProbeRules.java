package weighhouse.audit.pipeline;

import java.util.Optional;
import weighhouse.audit.ActsOn;
import weighhouse.audit.probe.Observation;
import weighhouse.quantity.Kind;

/** Which rule a way of acting breaks that the running model showed. */
final class ProbeRules {
  private ProbeRules() {}

  /**
   * The rule that is broken where a measure enters.
   *
   * @param measure kind of the measure
   * @param entered kind of the cells it enters
   * @param seen how it acts there
   */
  static Optional<String> broken(Kind measure, Kind entered, Observation.Entering seen) {
    if (near(seen.exponent(), 2)) {
      return Optional.of("ratio-applied-twice");
    }
    return switch (measure) {
      case HAZARD_RATIO, RATE_RATIO, HAZARD_REDUCTION, LOG_HAZARD_RATIO, LOG_RATE_RATIO ->
          onHazard(entered, seen, "hazard-ratio-times-probability");
      case MORTALITY_RATIO -> onHazard(entered, seen, "mortality-ratio-times-probability");
      case ODDS_RATIO, LOG_ODDS_RATIO -> onOdds(seen);
      case RISK_RATIO, RISK_REDUCTION, LOG_RISK_RATIO -> onRisk(entered, seen);
      default -> Optional.empty();
    };
  }

  private static Optional<String> onHazard(
      Kind entered, Observation.Entering seen, String timesProbability) {
    boolean plain = near(seen.exponent(), 1);
    return switch (seen.actsOn()) {
      case RISK ->
          plain
              ? Optional.of(timesProbability)
              : near(seen.exponent(), -1)
                  ? Optional.of("hazard-ratio-divides-probability")
                  : Optional.empty();
      case ODDS -> plain ? Optional.of("hazard-ratio-on-odds") : Optional.empty();
      case COMPLEMENT ->
          plain && entered == Kind.SURVIVAL
              ? Optional.of("hazard-ratio-times-survival")
              : Optional.empty();
      default -> Optional.empty();
    };
  }

  private static Optional<String> onOdds(Observation.Entering seen) {
    if (!near(seen.exponent(), 1)) {
      return Optional.empty();
    }
    return seen.actsOn() == ActsOn.RISK
        ? Optional.of("odds-ratio-times-probability")
        : seen.actsOn() == ActsOn.HAZARD
            ? Optional.of("odds-ratio-as-hazard-ratio")
            : Optional.empty();
  }

  private static Optional<String> onRisk(Kind entered, Observation.Entering seen) {
    return seen.actsOn() == ActsOn.HAZARD && near(seen.exponent(), 1) && entered == Kind.PROBABILITY
        ? Optional.of("risk-ratio-on-rate")
        : Optional.empty();
  }

  private static boolean near(double exponent, double wanted) {
    return Math.abs(exponent - wanted) < 1e-6;
  }
}
