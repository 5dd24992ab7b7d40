package weighhouse.effect.curve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What holds of every curve: hazards integrate, ratios scale, survival falls from 1. */
class CurveTest {
  private static final double[] TIMES = {0.1, 0.5, 1, 2, 5, 12};

  static List<Curve> curves() {
    return List.of(
        new Exponential(0.2),
        new Weibull(1.4, 6),
        new Weibull(0.7, 6),
        new Gompertz(0.1, 0.05),
        new Gompertz(-0.2, 0.1),
        new Gompertz(0, 0.1),
        new LogNormal(1.2, 0.8),
        new LogLogistic(1.6, 4),
        new GeneralisedGamma(1.2, 0.8, 0.6),
        new GeneralisedGamma(1.2, 0.8, -0.6),
        new GeneralisedGamma(1.2, 0.8, 0),
        new GeneralisedGamma(1.2, 0.8, 1),
        new ScaledHazard(new LogNormal(1.2, 0.8), 0.7),
        new StretchedTime(new Gompertz(0.1, 0.05), 1.5));
  }

  @ParameterizedTest
  @MethodSource("curves")
  void survivalFallsFromOne(Curve curve) {
    assertEquals(1, curve.survival(0));
    assertEquals(0, curve.cumulativeHazard(0));
    double last = 1;
    for (double t : TIMES) {
      assertTrue(curve.survival(t) < last);
      last = curve.survival(t);
      assertEquals(Math.exp(-curve.cumulativeHazard(t)), last, 1e-14);
    }
    assertTrue(Double.isNaN(curve.survival(-1)));
    assertTrue(Double.isNaN(curve.hazard(-1)));
  }

  @ParameterizedTest
  @MethodSource("curves")
  void theHazardIsTheSlopeOfTheCumulativeHazard(Curve curve) {
    IterativeLegendreGaussIntegrator integrator =
        new IterativeLegendreGaussIntegrator(20, 1e-12, 1e-14);
    double integral = integrator.integrate(10_000, curve::hazard, 1, 5);
    assertEquals(curve.cumulativeHazard(5) - curve.cumulativeHazard(1), integral, 1e-9);
    assertEquals(-Math.expm1(-integral), curve.probability(1, 5), 1e-9);
  }

  @ParameterizedTest
  @MethodSource("curves")
  void aHazardRatioMultipliesEveryHazard(Curve curve) {
    Curve scaled = curve.proportional(0.7);
    for (double t : TIMES) {
      assertEquals(0.7, scaled.cumulativeHazard(t) / curve.cumulativeHazard(t), 1e-12);
      assertEquals(0.7, scaled.hazard(t) / curve.hazard(t), 1e-12);
    }
  }

  @ParameterizedTest
  @MethodSource("curves")
  void aTimeRatioStretchesTime(Curve curve) {
    Curve stretched = curve.accelerated(1.5);
    for (double t : TIMES) {
      assertEquals(curve.survival(t), stretched.survival(1.5 * t), 1e-13);
      assertEquals(curve.hazard(t) / 1.5, stretched.hazard(1.5 * t), 1e-13);
    }
  }

  @Test
  void onlySomeFamiliesHoldAParameterForTheHazardRatio() {
    assertEquals(new Exponential(0.1), new Exponential(0.2).withHazardRatio(0.5).orElseThrow());
    assertEquals(new Gompertz(1, 0.1), new Gompertz(1, 0.2).withHazardRatio(0.5).orElseThrow());
    assertTrue(new LogNormal(1, 1).withHazardRatio(0.5).isEmpty());
    assertTrue(new LogLogistic(1, 1).withHazardRatio(0.5).isEmpty());
    assertTrue(new GeneralisedGamma(1, 1, 2).withHazardRatio(0.5).isEmpty());
    assertTrue(new GeneralisedGamma(1, 1, 1).withHazardRatio(0.5).isPresent());
  }

  @Test
  void bothFormsOfTheWeibullAgree() {
    Weibull weibull = Weibull.ofLambda(0.05, 1.4);
    assertEquals(Math.exp(-0.05 * Math.pow(3, 1.4)), weibull.survival(3), 1e-15);
    assertEquals(0.05, weibull.lambda(), 1e-15);
    Weibull scaled = (Weibull) weibull.withHazardRatio(0.6).orElseThrow();
    assertEquals(0.03, scaled.lambda(), 1e-15);
    double ratio = weibull.hazardRatioOfTimeRatio(2);
    Curve stretched = weibull.accelerated(2);
    assertEquals(weibull.proportional(ratio).survival(3), stretched.survival(3), 1e-14);
  }

  @Test
  void theGeneralisedGammaHoldsTheOthers() {
    for (double t : TIMES) {
      double weibull = new Weibull(1 / 0.8, Math.exp(1.2)).survival(t);
      assertEquals(weibull, new GeneralisedGamma(1.2, 0.8, 1).survival(t), 1e-13);
      double near = new GeneralisedGamma(1.2, 0.8, 2e-3).survival(t);
      assertEquals(new LogNormal(1.2, 0.8).survival(t), near, 1e-3);
    }
  }

  @Test
  void anOddsRatioActsOnTheLogLogistic() {
    LogLogistic curve = new LogLogistic(1.6, 4);
    LogLogistic scaled = curve.withOddsRatio(0.5);
    double odds = Math.expm1(curve.cumulativeHazard(3));
    assertEquals(odds / 2, Math.expm1(scaled.cumulativeHazard(3)), 1e-14);
  }

  @Test
  void parametersOutOfTheirDomainAreRefused() {
    assertThrows(IllegalArgumentException.class, () -> new Weibull(0, 1));
    assertThrows(IllegalArgumentException.class, () -> new Exponential(1 / 0.0));
    assertThrows(IllegalArgumentException.class, () -> new Gompertz(Double.NaN, 1));
    assertThrows(IllegalArgumentException.class, () -> new ScaledHazard(new Exponential(1), -1));
  }
}
