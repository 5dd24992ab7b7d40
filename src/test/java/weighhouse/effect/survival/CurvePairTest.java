package weighhouse.effect.survival;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import weighhouse.effect.curve.Curve;
import weighhouse.effect.curve.LogNormal;
import weighhouse.effect.curve.Weibull;

/** What two columns of survival say of proportional hazards. */
class CurvePairTest {
  private static final double[] TIMES =
      IntStream.rangeClosed(0, 40).mapToDouble(i -> i / 4.0).toArray();

  private static CurvePair pair(Curve control, Curve treated) {
    return CurvePair.of(
        TIMES,
        Arrays.stream(TIMES).map(control::survival).toArray(),
        Arrays.stream(TIMES).map(treated::survival).toArray());
  }

  @Test
  void proportionalCurvesAreParallelWithOneRatioThroughout() {
    Curve control = new LogNormal(1, 0.9);
    CurvePair pair = pair(control, control.proportional(0.7));
    assertEquals(0, pair.slope(), 1e-10);
    assertEquals(40, pair.implied().size());
    pair.implied().forEach(i -> assertEquals(0.7, i.hazardRatio(), 1e-10));
    assertEquals(Math.log(0.7), pair.points().get(7).logRatio(), 1e-12);
    assertTrue(Double.isNaN(pair.points().get(0).logRatio()));
    assertTrue(pair.crossings(0).isEmpty());
  }

  @Test
  void weibullCurvesOfTwoShapesDifferByTheirSlope() {
    CurvePair pair = pair(new Weibull(1.5, 4), new Weibull(0.9, 5));
    assertEquals(0.9 - 1.5, pair.slope(), 1e-10);
    assertEquals(1, pair.crossings(1e-9).size());
    double crossing = pair.crossings(1e-9).get(0);
    double exact = Math.pow(Math.pow(5, 0.9) / Math.pow(4, 1.5), 1 / (0.9 - 1.5));
    assertTrue(crossing >= exact && crossing < exact + 0.25);
    List<CurvePair.Implied> implied = pair.implied();
    assertTrue(implied.get(0).hazardRatio() > implied.get(39).hazardRatio());
  }

  @Test
  void differencesWithinTheToleranceAreNoCrossings() {
    double[] times = {1, 2, 3};
    double[] flat = {0.9, 0.8, 0.7};
    double[] near = {0.91, 0.79, 0.71};
    assertEquals(List.of(2.0, 3.0), CurvePair.of(times, flat, near).crossings(0));
    assertTrue(CurvePair.of(times, flat, near).crossings(0.02).isEmpty());
  }

  @Test
  void dataThatBreachProportionalHazardsShow() {
    // karno: the Grambsch-Therneau test of R survival 3.5.3 rejects with p = 5e-5.
    DataSet breach = DataSet.read("karno");
    CurvePair pair =
        CurvePair.of(KaplanMeier.of(breach.control()), KaplanMeier.of(breach.treated()));
    assertTrue(pair.slope() > 0.6, () -> "slope " + pair.slope());
    DataSet sound = DataSet.read("colon_death");
    CurvePair other =
        CurvePair.of(KaplanMeier.of(sound.control()), KaplanMeier.of(sound.treated()));
    assertTrue(Math.abs(other.slope()) < 0.3, () -> "slope " + other.slope());
  }

  @Test
  void columnsOfUnequalLengthAreRefused() {
    assertThrows(
        IllegalArgumentException.class,
        () -> CurvePair.of(new double[2], new double[2], new double[1]));
  }
}
