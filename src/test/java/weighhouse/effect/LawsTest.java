package weighhouse.effect;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;

/** Laws that hold whatever the numbers: identity, order, round trips, composition. */
class LawsTest {
  private static final int TRIES = 300;

  @Property(tries = TRIES)
  void noEffectChangesNothing(
      @ForAll EffectMeasure measure, @ForAll @DoubleRange(max = 0.99) double p) {
    Assume.that(measure.scale().isPresent());
    double neutral = measure.form().neutral();
    assertEquals(p, measure.applyToProbability(p, neutral), 1e-15);
    assertEquals(p, measure.applyToProbability(p, 1, neutral, 3), 1e-13);
    assertEquals(p, measure.applyToSurvival(p, neutral), 1e-15);
    assertEquals(p, measure.applyToRate(p, neutral, 2), 1e-14);
    assertEquals(p, measure.applyToOdds(p, neutral), 1e-14);
  }

  @Property(tries = TRIES)
  void aSmallerRatioGivesASmallerProbability(
      @ForAll Scale scale,
      @ForAll @DoubleRange(min = 0.01, max = 0.99) double p,
      @ForAll @DoubleRange(min = 0.01, max = 0.98) double low) {
    double high = low + 0.01;
    double less = scale.apply(p, scale == Scale.COMPLEMENT ? high : low);
    double more = scale.apply(p, scale == Scale.COMPLEMENT ? low : high);
    assertTrue(less < more);
  }

  @Property(tries = TRIES)
  void theRatioThatActedIsFoundAgain(
      @ForAll Scale scale,
      @ForAll @DoubleRange(min = 0.01, max = 0.99) double p,
      @ForAll @DoubleRange(min = 0.05, max = 1) double ratio) {
    assertEquals(ratio, scale.ratio(scale.apply(p, ratio), p), 1e-12);
  }

  @Property(tries = TRIES)
  void twoRatiosInTurnActAsTheirProduct(
      @ForAll Scale scale,
      @ForAll @DoubleRange(max = 0.99) double p,
      @ForAll @DoubleRange(min = 0.05, max = 1) double a,
      @ForAll @DoubleRange(min = 0.05, max = 1) double b) {
    assertEquals(scale.apply(p, a * b), scale.apply(scale.apply(p, a), b), 1e-14);
  }

  @Property(tries = TRIES)
  void hazardsRisksAndOddsOrderTheirEffects(
      @ForAll @DoubleRange(min = 0.01, max = 0.99) double p,
      @ForAll @DoubleRange(min = 0.05, max = 0.99) double ratio) {
    double risk = Probability.scaleRisk(p, ratio);
    double hazard = Probability.scaleHazard(p, ratio);
    double odds = Probability.scaleOdds(p, ratio);
    assertTrue(risk < hazard && hazard < odds);
  }

  @Property(tries = TRIES)
  void conversionsComeBack(
      @ForAll @DoubleRange(max = 0.99) double p,
      @ForAll @DoubleRange(min = 1, max = 100) double span) {
    assertEquals(p, Probability.ofRate(Probability.toRate(p, span), span), 1e-14);
    assertEquals(p, Probability.ofOdds(Probability.toOdds(p)), 1e-14);
    assertEquals(p, Probability.ofCumulativeHazard(Probability.toCumulativeHazard(p)), 1e-14);
    assertEquals(p, Probability.rescale(Probability.rescale(p, span, 1), 1, span), 1e-13);
  }

  @Property(tries = TRIES)
  void survivalOverPartsIsSurvivalOverTheWhole(
      @ForAll @DoubleRange(max = 0.99) double p,
      @ForAll @DoubleRange(min = 0.01, max = 10) double a,
      @ForAll @DoubleRange(min = 0.01, max = 10) double b) {
    double parts = (1 - Probability.rescale(p, 1, a)) * (1 - Probability.rescale(p, 1, b));
    assertEquals(1 - Probability.rescale(p, 1, a + b), parts, 1e-14);
  }

  @Property(tries = TRIES)
  void aHazardRatioCommutesWithAChangeOfCycle(
      @ForAll @DoubleRange(max = 0.99) double p,
      @ForAll @DoubleRange(min = 0.05, max = 1) double ratio,
      @ForAll @DoubleRange(min = 0.05, max = 1) double span) {
    double first = Probability.rescale(Probability.scaleHazard(p, ratio), 1, span);
    assertEquals(first, Probability.scaleHazard(Probability.rescale(p, 1, span), ratio), 1e-13);
  }

  @Property(tries = TRIES)
  void ratiosOfOneRiskAgreeWithEachOther(
      @ForAll @DoubleRange(min = 0.01, max = 0.95) double p0,
      @ForAll @DoubleRange(min = 0.05, max = 1) double riskRatio) {
    double oddsRatio = OddsRatio.ofRiskRatio(riskRatio, p0);
    double hazardRatio = RiskRatio.toHazardRatio(riskRatio, p0);
    assertEquals(riskRatio, RiskRatio.ofOddsRatio(oddsRatio, p0), 1e-12);
    assertEquals(riskRatio, RiskRatio.ofHazardRatio(hazardRatio, p0), 1e-12);
    assertEquals(hazardRatio, OddsRatio.toHazardRatio(oddsRatio, p0), 1e-12);
    double longer = RiskRatio.overHorizon(riskRatio, p0, 1, 2);
    double p2 = Probability.rescale(p0, 1, 2);
    assertEquals(riskRatio, RiskRatio.overHorizon(longer, p2, 2, 1), 1e-11);
  }

  @Property(tries = TRIES)
  void aMeasureSaysTheSameOnEveryQuantity(
      @ForAll EffectMeasure measure,
      @ForAll @DoubleRange(min = 0.01, max = 0.95) double p,
      @ForAll @DoubleRange(min = 0.05, max = 1) double ratio) {
    Assume.that(measure.scale().isPresent());
    double figure = measure.form().ofRatio(ratio);
    double expected = measure.applyToProbability(p, figure);
    double hazard = Probability.toCumulativeHazard(p);
    assertEquals(measure.scale().orElseThrow().apply(p, ratio), expected, 1e-14);
    assertEquals(1 - expected, measure.applyToSurvival(1 - p, figure), 1e-14);
    double hazardWith = measure.applyToCumulativeHazard(hazard, figure);
    assertEquals(expected, Probability.ofCumulativeHazard(hazardWith), 1e-14);
    double rateWith = measure.applyToRate(hazard / 4, figure, 4);
    assertEquals(expected, Probability.ofRate(rateWith, 4), 1e-13);
    double oddsWith = measure.applyToOdds(Probability.toOdds(p), figure);
    assertEquals(expected, Probability.ofOdds(oddsWith), 1e-13);
    assertEquals(expected, measure.applyToProbability(p, 2, figure, 2), 1e-13);
  }

  @Property(tries = TRIES)
  void aRiskRatioOnARateGoesThroughTheBaselineRisk(
      @ForAll @DoubleRange(min = 0.01, max = 0.5) double rate,
      @ForAll @DoubleRange(min = 0.05, max = 1) double ratio) {
    double p0 = Probability.ofRate(rate, 3);
    double expected = EffectMeasure.RISK_RATIO.applyToRate(rate, ratio, 3);
    assertEquals(expected, RiskRatio.applyToRate(rate, ratio, p0), 1e-13);
  }

  @Property(tries = TRIES)
  void exitsAndTheirHazardsComeBack(
      @ForAll @DoubleRange(max = 2) double a,
      @ForAll @DoubleRange(max = 2) double b,
      @ForAll @DoubleRange(min = 0.1, max = 3) double ratio) {
    double[] exits = CompetingExits.probabilities(a, b);
    assertArrayEquals(new double[] {a, b}, CompetingExits.hazards(exits), 1e-12);
    assertEquals(Math.exp(-a - b), CompetingExits.stay(exits), 1e-14);
    double[] scaled = CompetingExits.scaleHazard(exits, 0, ratio);
    assertArrayEquals(CompetingExits.probabilities(a * ratio, b), scaled, 1e-12);
    Assume.that(a > 1e-3);
    assertEquals(ratio, CompetingExits.hazardRatio(scaled, exits, 0), 1e-9);
  }

  @Property(tries = TRIES)
  void discountingOverPartsIsDiscountingOverTheWhole(
      @ForAll @DoubleRange(min = 0, max = 1) double rate,
      @ForAll @DoubleRange(min = 0.1, max = 20) double span) {
    double parts = Discounting.factor(Discounting.rescale(rate, 1, span), 1);
    assertEquals(1, parts / Discounting.factor(rate, span), 1e-12);
  }

  @Property(tries = TRIES)
  void mediansAndRatesComeBack(@ForAll @DoubleRange(min = 0.1, max = 100) double median) {
    assertEquals(median, MedianSurvival.ofRate(MedianSurvival.toRate(median)), 1e-12);
    assertEquals(0.5, Probability.ofRate(MedianSurvival.toRate(median), median), 1e-15);
  }
}
