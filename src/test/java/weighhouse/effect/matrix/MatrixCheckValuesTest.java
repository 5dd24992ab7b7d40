package weighhouse.effect.matrix;

import static java.util.Map.entry;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.effect.CompetingExits;
import weighhouse.effect.Probability;
import weighhouse.support.CheckValues;

/** Published cohorts, competing exits, and roots of published matrices. */
class MatrixCheckValuesTest {
  private static final double MONTH = 1 / 12.0;

  /** Counts of the HIV model, monotherapy (Briggs, Claxton and Sculpher 2006; row C08). */
  private static double[][] hiv() {
    return new double[][] {
      {1251 / 1734.0, 350 / 1734.0, 116 / 1734.0, 17 / 1734.0},
      {0, 731 / 1258.0, 512 / 1258.0, 15 / 1258.0},
      {0, 0, 1312 / 1749.0, 437 / 1749.0},
      {0, 0, 0, 1}
    };
  }

  @TestFactory
  Stream<DynamicTest> cohorts() {
    double[][] p = {{0.6, 0.2, 0.2}, {0, 0.6, 0.4}, {0, 0, 1}};
    double[] first = TransitionMatrix.next(new double[] {10_000, 0, 0}, p);
    double[] second = TransitionMatrix.next(first, p);
    double[][] visits = TransitionMatrix.fundamental(new double[][] {{0.6, 0.2}, {0, 0.6}});
    return CheckValues.rows(
        "S\\d+",
        Map.ofEntries(
            entry("S01", () -> reward(first)),
            entry("S02", () -> reward(first) + reward(second)),
            entry("S04", () -> visits[0][0]),
            entry("S05", () -> visits[0][1]),
            entry("S06", () -> reward(visits[0]) - 1)));
  }

  private static double reward(double[] occupancy) {
    return occupancy[0] + 0.7 * occupancy[1];
  }

  @TestFactory
  Stream<DynamicTest> competingExitsAndRoots() {
    double[][] rates = {{-0.156, 0.15, 0.006}, {0, -0.06, 0.06}, {0, 0, 0}};
    double[][] exact = Generator.probabilities(rates, 1);
    double[] split = CompetingExits.probabilities(0.15, 0.006);
    double[][] log = MatrixLogarithm.of(hiv()).orElseThrow();
    double[][] month = MatrixRoot.of(hiv(), MONTH).principal().orElseThrow();
    double[][] year = TransitionMatrix.power(TransitionMatrix.elementByElement(hiv(), MONTH), 12);
    double[][] threeYears = {
      {0.251, 0.495, 0.200, 0.054},
      {0.078, 0.426, 0.304, 0.191},
      {0, 0.103, 0.310, 0.586},
      {0, 0, 0.091, 0.909}
    };
    double[][] cubeRoot = MatrixRoot.of(threeYears, 1 / 3.0).principal().orElseThrow();
    return CheckValues.rows(
        "C\\d+",
        Map.ofEntries(
            entry("C01", () -> exact[0][1]),
            entry("C02", () -> exact[0][2]),
            entry("C03", () -> Probability.ofRate(0.006, 1)),
            entry("C04", () -> Probability.ofRate(0.15, 1)),
            entry("C05", () -> split[0]),
            entry("C06", () -> split[1]),
            entry("C07", () -> Generator.secondOfThree(0.15, 0.006, 0.06)),
            entry("C08", () -> log[1][3]),
            entry("C09", () -> month[1][3]),
            entry("C10", () -> year[0][1]),
            entry("C11", () -> year[1][3]),
            entry("C12", () -> cubeRoot[0][0]),
            entry("C13", () -> cubeRoot[0][3]),
            entry("C14", () -> cubeRoot[2][0])));
  }
}
