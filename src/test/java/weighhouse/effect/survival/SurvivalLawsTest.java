package weighhouse.effect.survival;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;
import weighhouse.effect.estimate.RatioEstimate;

/** Laws of estimates from people's times, over samples of any make. */
class SurvivalLawsTest {

  /** Every third person censored. */
  private static SurvivalTimes sample(List<Integer> times) {
    boolean[] events = new boolean[times.size()];
    IntStream.range(0, events.length).forEach(i -> events[i] = i % 3 != 2);
    return SurvivalTimes.of(times.stream().mapToDouble(t -> t).toArray(), events);
  }

  @Property(tries = 100)
  void withoutCensoringSurvivalIsTheShareStillThere(
      @ForAll @Size(12) List<@IntRange(min = 1, max = 20) Integer> times) {
    boolean[] all = new boolean[times.size()];
    Arrays.fill(all, true);
    double[] numbers = times.stream().mapToDouble(t -> t).toArray();
    KaplanMeier curve = KaplanMeier.of(SurvivalTimes.of(numbers, all));
    for (double t = 0.5; t < 21; t += 0.5) {
      double time = t;
      double share = Arrays.stream(numbers).filter(n -> n > time).count() / 12.0;
      assertEquals(share, curve.survival(t), 1e-14);
      assertTrue(Math.exp(-curve.cumulativeHazard(t)) >= curve.survival(t) - 1e-14);
    }
  }

  @Property(tries = 100)
  void swappingTheArmsTurnsEveryEstimateRound(
      @ForAll @Size(9) List<@IntRange(min = 1, max = 20) Integer> a,
      @ForAll @Size(9) List<@IntRange(min = 1, max = 20) Integer> b) {
    SurvivalTimes x = sample(a);
    SurvivalTimes y = sample(b);
    LogRank there = LogRank.of(x, y);
    LogRank back = LogRank.of(y, x);
    assertEquals(-there.treated().difference(), back.treated().difference(), 1e-12);
    assertEquals(there.treated().variance(), back.treated().variance(), 1e-12);
    for (Ties ties : Ties.values()) {
      var fit = CoxRegression.fit(CoxData.ofArms(x, y), ties);
      var turned = CoxRegression.fit(CoxData.ofArms(y, x), ties);
      assertEquals(fit.isPresent(), turned.isPresent());
      fit.ifPresent(f -> assertTurned(f, turned.orElseThrow()));
    }
    var weibull = WeibullFit.of(x, y);
    weibull.ifPresent(
        w -> assertEquals(1, w.timeRatio() * WeibullFit.of(y, x).orElseThrow().timeRatio(), 1e-10));
  }

  private static void assertTurned(CoxFit fit, CoxFit turned) {
    RatioEstimate one = fit.hazardRatios().get(0);
    RatioEstimate other = turned.hazardRatios().get(0);
    assertEquals(-one.log(), other.log(), 1e-8);
    assertEquals(one.standardError(), other.standardError(), 1e-8);
    assertEquals(fit.logLikelihood(), turned.logLikelihood(), 1e-10);
  }

  @Property(tries = 50)
  void aChangeOfTheUnitOfTimeChangesNoRatio(
      @ForAll @Size(9) List<@IntRange(min = 1, max = 20) Integer> a,
      @ForAll @Size(9) List<@IntRange(min = 1, max = 20) Integer> b) {
    SurvivalTimes x = sample(a);
    SurvivalTimes y = sample(b);
    SurvivalTimes longX = sample(a.stream().map(t -> 12 * t).toList());
    SurvivalTimes longY = sample(b.stream().map(t -> 12 * t).toList());
    double chiSquare = LogRank.of(x, y).chiSquare();
    assertEquals(chiSquare, LogRank.of(longX, longY).chiSquare(), 1e-12);
    WeibullFit.of(x, y)
        .ifPresent(
            fit -> {
              WeibullFit scaled = WeibullFit.of(longX, longY).orElseThrow();
              assertEquals(fit.shape(), scaled.shape(), 1e-9 * fit.shape());
              assertEquals(12 * fit.control().scale(), scaled.control().scale(), 1e-7);
            });
  }

  @Property(tries = 50)
  void withoutTiesAllTreatmentsOfTiesAgree(
      @ForAll @Size(12) List<@IntRange(min = 1, max = 1000) Integer> gaps) {
    double[] times = new double[gaps.size()];
    IntStream.range(0, times.length)
        .forEach(i -> times[i] = (i == 0 ? 0 : times[i - 1]) + gaps.get(i));
    SurvivalTimes x = every(times, 0);
    SurvivalTimes y = every(times, 1);
    CoxData data = CoxData.ofArms(x, y);
    double breslow =
        CoxRegression.fit(data, Ties.BRESLOW).orElseThrow().hazardRatios().get(0).log();
    double efron = CoxRegression.fit(data, Ties.EFRON).orElseThrow().hazardRatios().get(0).log();
    assertEquals(breslow, efron, 1e-10);
    for (ExactTies ties : ExactTies.values()) {
      assertEquals(breslow, ties.hazardRatio(x, y).log(), 1e-6);
    }
  }

  private static SurvivalTimes every(double[] times, int remainder) {
    double[] own =
        IntStream.range(0, times.length)
            .filter(i -> i % 2 == remainder)
            .mapToDouble(i -> times[i])
            .toArray();
    boolean[] events = new boolean[own.length];
    Arrays.fill(events, true);
    return SurvivalTimes.of(own, events);
  }

  @Example
  void whatHasNoEstimateGivesNone() {
    SurvivalTimes all = DataSet.times(new double[] {1, 2, 3}, new double[] {1, 1, 1});
    SurvivalTimes none = DataSet.times(new double[] {1, 2, 3}, new double[] {0, 0, 0});
    assertTrue(CoxRegression.fit(CoxData.ofArms(none, none), Ties.EFRON).isEmpty());
    assertTrue(CoxRegression.fit(CoxData.ofArms(none, all), Ties.EFRON).isEmpty());
    double[][] same = {{2}, {2}, {2}};
    assertTrue(CoxRegression.fit(CoxData.of(all, same), Ties.EFRON).isEmpty());
    assertTrue(WeibullFit.of(none, all).isEmpty());
    SurvivalTimes atZero = DataSet.times(new double[] {0, 2}, new double[] {1, 1});
    assertTrue(WeibullFit.of(atZero, all).isEmpty());
    assertTrue(Double.isNaN(KaplanMeier.of(none).median()));
    assertEquals(1, KaplanMeier.of(none).survival(5));
    assertEquals(0, KaplanMeier.of(none).cumulativeHazard(5));
  }

  @Example
  void theMedianIsTheMiddleOfARestOnOneHalf() {
    SurvivalTimes four = DataSet.times(new double[] {1, 2, 5, 9}, new double[] {1, 1, 1, 1});
    assertEquals(3.5, KaplanMeier.of(four).median());
    SurvivalTimes three = DataSet.times(new double[] {1, 2, 5}, new double[] {1, 1, 1});
    assertEquals(2, KaplanMeier.of(three).median());
    assertEquals(2 / 3.0, KaplanMeier.of(three).survivalBefore(2), 1e-15);
  }

  @Example
  void dataOfTheWrongMakeAreRefused() {
    boolean[] one = {true};
    assertThrows(IllegalArgumentException.class, () -> SurvivalTimes.of(new double[] {1, 2}, one));
    assertThrows(IllegalArgumentException.class, () -> SurvivalTimes.of(new double[] {-1}, one));
    assertThrows(
        IllegalArgumentException.class, () -> SurvivalTimes.of(new double[] {Double.NaN}, one));
    SurvivalTimes person = SurvivalTimes.of(new double[] {1}, one);
    SurvivalTimes nobody = SurvivalTimes.of(new double[0], new boolean[0]);
    assertThrows(IllegalArgumentException.class, () -> LogRank.of(person, nobody));
    assertThrows(IllegalArgumentException.class, () -> CoxData.of(person, new double[1][0]));
    assertThrows(IllegalArgumentException.class, () -> CoxData.of(person, new double[2][1]));
    double[][] infinite = {{1 / 0.0}};
    assertThrows(IllegalArgumentException.class, () -> CoxData.of(person, infinite));
  }
}
