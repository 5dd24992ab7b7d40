package weighhouse.audit.probe;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import weighhouse.audit.ActsOn;

/** The table of what a probability's answer to a ratio tells: one row a way in which ratios act. */
class ResponseTest {
  private static final double P = 0.3;
  private static final double SHAPE = 1.4;

  static List<Arguments> ways() {
    return List.of(
        way("1-(1-p)^R", ActsOn.HAZARD, 1, r -> 1 - Math.pow(1 - P, r)),
        way("1-EXP(-r*R)", ActsOn.HAZARD, 1, r -> 1 - Math.exp(-0.2 * r)),
        way("p*R", ActsOn.RISK, 1, r -> P * r),
        way("p/R", ActsOn.RISK, -1, r -> P / r),
        way("odds*R", ActsOn.ODDS, 1, r -> P * r / (1 - P + P * r)),
        way("1-(1-p)*R", ActsOn.COMPLEMENT, 1, r -> 1 - (1 - P) * r),
        way("hazard, twice", ActsOn.HAZARD, 2, r -> 1 - Math.pow(1 - P, r * r)),
        way("hazard, inverted", ActsOn.HAZARD, -1, r -> 1 - Math.pow(1 - P, 1 / r)),
        way("on a Weibull scale", ActsOn.HAZARD, -SHAPE, r -> -Math.expm1(-Math.pow(2 / r, SHAPE))),
        way("p+ln R", ActsOn.MIXED, Double.NaN, r -> P + Math.log(r) / 10),
        way("not at all", ActsOn.NOTHING, 0, r -> P));
  }

  private static Arguments way(String name, ActsOn scale, double exponent, DoubleUnaryOperator f) {
    return Arguments.of(name, scale, exponent, f);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("ways")
  void tellsTheScale(String name, ActsOn scale, double exponent, DoubleUnaryOperator formula) {
    List<Double> settings = List.of(0.7, 0.83, 0.61);
    Response response =
        new Response(
            formula.applyAsDouble(1),
            settings,
            settings.stream().map(formula::applyAsDouble).toList());
    assertEquals(scale, response.read().scale(), name);
    assertEquals(exponent, response.read().exponent(), 1e-9, name);
  }
}
