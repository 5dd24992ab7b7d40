package weighhouse.effect;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import weighhouse.support.Reference;

/** Conversions against the grid computed by R 4.2.2 (expected-scalars.csv). */
class ScalarGridTest {

  @Test
  void everyPointOfTheGrid() {
    for (Reference.Row row : Reference.rows("expected-scalars.csv")) {
      double p = row.number("p");
      double ratio = row.number("ratio");
      check(row, "p_hazard_ratio", Probability.scaleHazard(p, ratio));
      check(row, "p_odds_ratio", Probability.scaleOdds(p, ratio));
      check(row, "p_multiplied", Probability.scaleRisk(p, ratio));
      check(row, "p_month", Probability.rescale(p, 12, 1));
      check(row, "p_decade", Probability.rescale(p, 1, 10));
      check(row, "rate", Probability.toRate(p, 1));
    }
  }

  private static void check(Reference.Row row, String column, double ours) {
    double expected = row.number(column);
    assertEquals(expected, ours, 1e-14 * Math.max(expected, 1e-3), column + " of " + row);
  }
}
