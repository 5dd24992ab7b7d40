package weighhouse.effect.estimate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import weighhouse.effect.StandardNormal;

/** Laws of estimates: intervals come back, comparisons and pooling are consistent. */
class EstimateLawsTest {
  private static final double Z = 1.96;

  @Property(tries = 200)
  void anIntervalComesBack(
      @ForAll @DoubleRange(min = 0.1, max = 5) double ratio,
      @ForAll @DoubleRange(min = 0.01, max = 1) double error) {
    RatioEstimate estimate = new RatioEstimate(Math.log(ratio), error);
    RatioEstimate again = RatioEstimate.ofInterval(ratio, estimate.lower(Z), estimate.upper(Z), Z);
    assertEquals(error, again.standardError(), 1e-13);
    RatioEstimate inverse = estimate.reciprocal();
    assertEquals(1 / estimate.upper(Z), inverse.lower(Z), 1e-12 * inverse.lower(Z));
    assertEquals(1 / estimate.lower(Z), inverse.upper(Z), 1e-12 * inverse.upper(Z));
    assertEquals(ratio, estimate.quantile(0.5), 1e-12);
  }

  @Property(tries = 200)
  void intervalsRoundedToTwoDigitsAreTakenAsSymmetric(
      @ForAll @DoubleRange(min = 0.2, max = 3) double ratio,
      @ForAll @DoubleRange(min = 0.05, max = 0.5) double error) {
    RatioEstimate estimate = new RatioEstimate(Math.log(ratio), error);
    double printed = Math.round(ratio * 100) / 100.0;
    double lower = Math.round(estimate.lower(Z) * 100) / 100.0;
    double upper = Math.round(estimate.upper(Z) * 100) / 100.0;
    assertTrue(LogSymmetry.of(printed, lower, upper, 2).holds());
  }

  @Example
  void anIntervalSymmetricOnTheNaturalScaleIsNoticed() {
    LogSymmetry symmetry = LogSymmetry.of(0.70, 0.50, 0.90, 2);
    assertFalse(symmetry.holds());
    assertEquals(Math.sqrt(0.45), symmetry.estimate(), 1e-15);
    assertEquals(0.49 / 0.9, symmetry.lower(), 1e-15);
    assertEquals(0.98, symmetry.upper(), 1e-15);
    assertTrue(LogSymmetry.of(0.7, 0.5, 0.98, 2).holds());
    assertTrue(LogSymmetry.of(0.7, 0.5, 0.9, 1).holds());
    assertFalse(LogSymmetry.of(0.1, 0, 0.2, 1).holds());
    assertEquals(3, LogSymmetry.decimals(0.509));
    assertEquals(0, LogSymmetry.decimals(200));
    assertEquals(0, LogSymmetry.decimals(Double.NaN));
  }

  @Property(tries = 100)
  void poolingOneTrialGivesItBack(@ForAll @DoubleRange(min = -1, max = 1) double log) {
    List<RatioEstimate> one = List.of(new RatioEstimate(log, 0.2));
    for (Pooling.Pooled pooled :
        List.of(
            Pooling.commonEffect(one),
            Pooling.derSimonianLaird(one),
            Pooling.restrictedLikelihood(one))) {
      assertEquals(log, pooled.estimate().log(), 1e-14);
      assertEquals(0.2, pooled.estimate().standardError(), 1e-14);
      assertEquals(0, pooled.betweenTrials());
    }
  }

  @Example
  void equalTrialsShowNoHeterogeneity() {
    RatioEstimate trial = new RatioEstimate(-0.3, 0.2);
    Pooling.Pooled pooled = Pooling.restrictedLikelihood(List.of(trial, trial, trial, trial));
    assertEquals(0, pooled.betweenTrials());
    assertEquals(0.1, pooled.estimate().standardError(), 1e-15);
    assertEquals(0, pooled.heterogeneity(), 1e-15);
    assertThrows(IllegalArgumentException.class, () -> Pooling.commonEffect(List.of()));
  }

  @Property(tries = 100)
  void pValuesAndStatisticsComeBack(@ForAll @DoubleRange(min = 0.01, max = 0.99) double p) {
    assertEquals(p, StandardNormal.twoSidedP(StandardNormal.ofTwoSidedP(p)), 1e-12);
    assertEquals(p, 1 - StandardNormal.upperTail(StandardNormal.quantile(p)), 1e-12);
    RatioEstimate estimate = RatioEstimate.ofStatistic(0.7, StandardNormal.ofTwoSidedP(p));
    assertEquals(p, estimate.p(), 1e-12);
  }

  @Example
  void statisticsOutOfTheirDomainGiveNaN() {
    assertTrue(Double.isNaN(StandardNormal.quantile(1.2)));
    assertTrue(Double.isNaN(StandardNormal.ofTwoSidedP(0)));
    assertTrue(Double.isNaN(StandardNormal.ofTwoSidedPByFormula(0)));
    assertTrue(Double.isNaN(RatioEstimate.ofInterval(0.7, -0.1, 0.9, Z).standardError()));
    ObservedExpected none = new ObservedExpected(0, 10);
    assertEquals(1, none.p());
    assertEquals(0, none.chiSquare());
  }
}
