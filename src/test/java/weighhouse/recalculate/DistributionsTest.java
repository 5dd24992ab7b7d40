package weighhouse.recalculate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.support.Reference;

/** Distribution functions against R (expected-quantiles.csv) and SciPy (rows X of check-values). */
class DistributionsTest {
  private static final double RELATIVE = 1e-9;

  private static final Map<String, String> FORMULAS =
      Map.of(
          "beta", "BETA.INV(%s,%s,%s)",
          "gamma_shape_scale", "GAMMA.INV(%s,%s,%s)",
          "normal", "NORM.INV(%s,%s,%s)",
          "lognormal_mu_sigma", "LOGNORM.INV(%s,%s,%s)",
          "weibull_cdf_shape_scale_at_100p", "WEIBULL.DIST(100*%s,%s,%s,TRUE)");

  private static final Book BOOK = new Book().set("A1", 1);

  @TestFactory
  Stream<DynamicTest> quantiles() {
    return Reference.rows("expected-quantiles.csv").stream()
        .map(
            row -> {
              String formula =
                  String.format(
                      FORMULAS.get(row.text("fn")), row.text("p"), row.text("a"), row.text("b"));
              return test(formula, row.number("value"));
            });
  }

  @TestFactory
  Stream<DynamicTest> checkValues() {
    return Reference.rows("check-values.csv").stream()
        .filter(row -> row.text("id").startsWith("X"))
        .map(
            row -> {
              String formula = row.text("quantity").replaceAll("^=| in Excel.*", "");
              return test(formula, row.number("value"));
            });
  }

  private static DynamicTest test(String formula, double expected) {
    return DynamicTest.dynamicTest(
        formula,
        () ->
            assertEquals(
                expected, BOOK.formula(formula, "B1").number(), RELATIVE * Math.abs(expected)));
  }
}
