package weighhouse.effect;

import static java.util.Map.entry;

import java.util.Map;
import java.util.function.DoubleSupplier;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.support.CheckValues;

/** Published and derived values: rates and rescaling, effects on a probability, discounting. */
class ScalarCheckValuesTest {
  private static final double MONTH = 1 / 12.0;

  @TestFactory
  Stream<DynamicTest> ratesAndRescaling() {
    return CheckValues.rows(
        "R\\d+",
        Map.ofEntries(
            value("R01", () -> Probability.rescale(0.6, 3, 1)),
            value("R02", () -> Probability.toRate(0.6, 3)),
            value("R03", () -> Probability.rescale(0.3, 5, 1)),
            value("R04", () -> Probability.scaleRisk(0.17, 2.37)),
            value("R05", () -> Probability.ofRate(500 / 10000.0, 1)),
            value("R06", () -> Probability.ofRate(0.05, MONTH)),
            value("R07", () -> Probability.ofRate(0.162, 5)),
            value("R08", () -> Probability.rescale(0.65, 5, 1)),
            value("R09", () -> Probability.rescale(0.5, 1, MONTH)),
            value("R10", () -> 0.5 / 12)));
  }

  @TestFactory
  Stream<DynamicTest> effectsOnProbabilities() {
    double or = OddsRatio.between(0.18, 0.24);
    return CheckValues.rows(
        "E\\d+",
        Map.ofEntries(
            value("E01", () -> EffectMeasure.HAZARD_RATIO.applyToProbability(0.2, 0.7)),
            value("E02", () -> EffectMeasure.RISK_RATIO.applyToProbability(0.2, 0.7)),
            value("E03", () -> EffectMeasure.HAZARD_RATIO.applyToProbability(0.6, 2.5)),
            value("E04", () -> EffectMeasure.ODDS_RATIO.applyToProbability(0.2, 36)),
            value("E06", () -> Probability.scaleOdds(0.51, 1.9)),
            value("E07", () -> RiskRatio.ofOddsRatio(or, 0.24)),
            value("E08", () -> or),
            value("E09", () -> RiskRatio.ofOddsRatio(2, 0.1)),
            value("E10", () -> RiskRatio.ofOddsRatio(3, 0.3)),
            value("E11", () -> RiskRatio.ofOddsRatio(0.5, 0.5)),
            value("E12", () -> RiskRatio.ofHazardRatio(0.5, 0.05)),
            value("E13", () -> RiskRatio.ofHazardRatio(0.5, 0.5)),
            value("E14", () -> RiskRatio.ofHazardRatio(0.5, 0.95)),
            value("E15", () -> RiskRatio.ofHazardRatio(0.7, 0.2)),
            value("E16", () -> RiskRatio.ofHazardRatio(2, 0.5)),
            value("E17", () -> RiskRatio.ofHazardRatioForCommonOutcome(0.5)),
            value("E18", () -> RiskRatio.ofHazardRatioForCommonOutcome(2)),
            value("E19", () -> MedianSurvival.hazardRatio(14, 18)),
            value("E20", () -> MedianSurvival.toRate(14)),
            value("E21", () -> EffectMeasure.MORTALITY_RATIO.applyToProbability(0.0535, 2)),
            value("E22", () -> EffectMeasure.MORTALITY_RATIO.applyToProbability(0.1548, 3.5)),
            value("E23", () -> EffectMeasure.MORTALITY_RATIO.applyToProbability(0.3, 3.5)),
            value("E24", () -> Probability.ofRate(0.105 * 0.6, 1)),
            value("E25", () -> Probability.scaleRisk(Probability.ofRate(0.105, 1), 0.6))));
  }

  @TestFactory
  Stream<DynamicTest> discounting() {
    return CheckValues.rows(
        "G\\d+",
        Map.ofEntries(
            value("G01", () -> Discounting.rescale(0.035, 1, MONTH)),
            value("G02", () -> 0.035 / 12),
            value("G03", () -> Discounting.factor(0.035, 2))));
  }

  private static Map.Entry<String, DoubleSupplier> value(String id, DoubleSupplier ours) {
    return entry(id, ours);
  }
}
