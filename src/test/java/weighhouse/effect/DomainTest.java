package weighhouse.effect;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The ends of the domains, and what lies beyond. */
class DomainTest {

  @ParameterizedTest
  @ValueSource(doubles = {-0.1, 1.1, Double.NaN, Double.NEGATIVE_INFINITY})
  void whatIsNoProbabilityGivesNaN(double p) {
    List<Double> results =
        List.of(
            Probability.toRate(p, 1),
            Probability.toCumulativeHazard(p),
            Probability.toOdds(p),
            Probability.rescale(p, 1, 2),
            Probability.scaleHazard(p, 0.7),
            Probability.scaleRisk(p, 0.7),
            Probability.scaleOdds(p, 0.7),
            Probability.scaleComplement(p, 0.7),
            Probability.ofSurvival(p, 0.1),
            RiskRatio.ofOddsRatio(0.7, p),
            EffectMeasure.HAZARD_RATIO.applyToSurvival(p, 0.7));
    assertTrue(results.stream().allMatch(r -> Double.isNaN(r)), results::toString);
  }

  @ParameterizedTest
  @ValueSource(doubles = {-0.1, Double.NaN})
  void negativeRatesOddsAndRatiosGiveNaN(double number) {
    List<Double> results =
        List.of(
            Probability.ofRate(number, 1),
            Probability.ofRate(1, number),
            Probability.ofCumulativeHazard(number),
            Probability.ofOdds(number),
            Probability.rescale(0.3, number, 1),
            Probability.scaleHazard(0.3, number),
            Probability.scaleRisk(0.3, number),
            Probability.scaleOdds(0.3, number),
            Probability.scaleComplement(0.3, number),
            MedianSurvival.toRate(number),
            RiskRatio.ofOddsRatio(number, 0.3),
            RiskRatio.ofHazardRatioForCommonOutcome(number),
            RiskRatio.applyToRate(number, 0.7, 0.3),
            EffectMeasure.HAZARD_RATIO.applyToCumulativeHazard(number, 0.7),
            EffectMeasure.HAZARD_RATIO.applyToCumulativeHazard(0.7, number),
            EffectMeasure.ODDS_RATIO.applyToOdds(number, 0.7),
            EffectMeasure.ODDS_RATIO.applyToOdds(0.7, number));
    assertTrue(results.stream().allMatch(r -> Double.isNaN(r)), results::toString);
  }

  @ParameterizedTest
  @EnumSource(Scale.class)
  void certaintyAndImpossibilityHaveTheirPlaceOnEveryScale(Scale scale) {
    assertEquals(scale == Scale.COMPLEMENT ? 1 : 0, scale.of(0));
    double certain = scale == Scale.COMPLEMENT ? 0 : scale == Scale.RISK ? 1 : 1 / 0.0;
    assertEquals(certain, scale.of(1));
    assertTrue(Double.isNaN(scale.of(1.5)));
  }

  @Test
  void limitsOfTheHazardScale() {
    assertEquals(1, Probability.ofRate(1 / 0.0, 1));
    assertEquals(1, Probability.scaleHazard(1, 0.5));
    assertEquals(0, Probability.scaleHazard(1, 0));
    assertEquals(0, Probability.scaleHazard(0, 1 / 0.0));
    assertEquals(1, Probability.ofOdds(1 / 0.0));
    assertEquals(1e-300, Probability.scaleHazard(1e-300, 1), 1e-313);
  }

  @Test
  void productsMayLeaveTheUnitInterval() {
    assertEquals(1.5, Probability.scaleRisk(0.6, 2.5), 1e-15);
    assertEquals(-0.2, Probability.scaleComplement(0.4, 2), 1e-15);
  }

  @Test
  void aRiskRatioBeyondItsBaselineHasNoHazardRatio() {
    assertTrue(Double.isNaN(RiskRatio.toHazardRatio(2.5, 0.6)));
    assertTrue(Double.isNaN(OddsRatio.ofRiskRatio(2.5, 0.6)));
  }

  @Test
  void survivalThatRisesHasNoConditionalProbability() {
    assertTrue(Double.isNaN(Probability.ofSurvival(0.5, 0.6)));
    assertTrue(Double.isNaN(Probability.ofSurvival(0, 0)));
    assertTrue(Double.isNaN(Probability.ofSurvival(0.5, -0.1)));
    assertEquals(0.25, Probability.ofSurvival(0.8, 0.6), 1e-15);
    assertEquals(1, Probability.ofSurvival(0.8, 0));
  }

  @Test
  void aTimeRatioSaysNothingOfALoneProbability() {
    assertTrue(Double.isNaN(EffectMeasure.TIME_RATIO.applyToProbability(0.3, 2)));
    assertTrue(EffectMeasure.LOG_TIME_RATIO.scale().isEmpty());
  }

  @Test
  void exitsThatSumToOneOrAreNegativeHaveNoHazards() {
    double[] none = {Double.NaN, Double.NaN};
    assertArrayEquals(none, CompetingExits.hazards(0.6, 0.4));
    assertArrayEquals(none, CompetingExits.hazards(0.6, -0.1));
    assertArrayEquals(new double[] {0, 0}, CompetingExits.hazards(0, 0));
    assertArrayEquals(new double[] {0, 0}, CompetingExits.probabilities(0, 0));
    assertTrue(Double.isNaN(CompetingExits.probabilities(-0.1, 0.3)[0]));
  }

  @Test
  void discountRatesStayAboveMinusOne() {
    assertTrue(Double.isNaN(Discounting.factor(-1, 2)));
    assertTrue(Double.isNaN(Discounting.rescale(-1, 1, 2)));
    assertTrue(Double.isNaN(Discounting.rescale(0.03, 0, 2)));
  }
}
