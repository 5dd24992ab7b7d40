package weighhouse.effect.matrix;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import weighhouse.support.Reference;

/** Exponentials, logarithms and roots against R expm 0.999.7 (expected-matrices.csv). */
class MatrixReferenceTest {
  private static final double TOLERANCE = 1e-10;
  private static final double MONTH = 1 / 12.0;
  private static final List<Reference.Row> ROWS = Reference.rows("expected-matrices.csv");

  @ParameterizedTest
  @ValueSource(strings = {"three_state", "illness_death_recovery", "four_state"})
  void generators(String name) {
    double[][] rates = expected(name, "generator_per_year");
    checkSpan(name, rates, "0.0833333333333333", MONTH);
    checkSpan(name, rates, "0.25", 0.25);
    checkSpan(name, rates, "0.5", 0.5);
    checkSpan(name, rates, "1", 1);
    checkSpan(name, rates, "2", 2);
    double[][] scaled = Generator.scaleEntering(rates, rates.length - 1, 0.6);
    assertMatrix(expected(name, "generator_death_hr_0.6"), scaled);
    assertMatrix(expected(name, "probability_1y_death_hr_0.6"), Generator.probabilities(scaled, 1));
  }

  private static void checkSpan(String name, double[][] rates, String label, double span) {
    double[][] expected = expected(name, "probability_over_" + label + "_years");
    double[][] ours = Generator.probabilities(rates, span);
    assertMatrix(expected, ours);
    double[][] log = MatrixLogarithm.of(ours).orElseThrow();
    assertMatrix(rates, divided(log, span));
  }

  @ParameterizedTest
  @ValueSource(strings = {"annual_a", "annual_b"})
  void monthlyRoots(String name) {
    double[][] annual = expected(name, "probability_per_year");
    assertMatrix(expected(name, "matrix_log"), MatrixLogarithm.of(annual).orElseThrow());
    double[][] root = MatrixRoot.of(annual, MONTH).principal().orElseThrow();
    assertMatrix(expected(name, "monthly_root_of_matrix_log"), root);
    assertMatrix(annual, TransitionMatrix.power(root, 12));
  }

  @ParameterizedTest
  @ValueSource(strings = {"annual_a", "annual_b", "no_real_generator"})
  void elementByElement(String name) {
    double[][] annual = expected(name, "probability_per_year");
    double[][] monthly = TransitionMatrix.elementByElement(annual, MONTH);
    assertMatrix(expected(name, "monthly_element_by_element"), monthly);
    assertMatrix(
        expected(name, "annual_from_element_by_element"), TransitionMatrix.power(monthly, 12));
  }

  @Test
  void annualAHasAValidRoot() {
    MatrixRoot root = MatrixRoot.of(expected("annual_a", "probability_per_year"), MONTH);
    assertEquals(RootVerdict.VALID, root.verdict());
    assertTrue(root.valid().isPresent());
    NearestRoot nearest = root.nearest(Regularisation.QUASI_OPTIMISATION).orElseThrow();
    assertEquals(0, nearest.largestMiss(), 1e-13);
  }

  @Test
  void annualBHasNoValidMonthlyRoot() {
    MatrixRoot root = MatrixRoot.of(expected("annual_b", "probability_per_year"), MONTH);
    assertEquals(RootVerdict.NEGATIVE_ENTRIES, root.verdict());
    assertTrue(root.valid().isEmpty());
    assertEquals(-0.00525663388509143, root.smallestEntry(), TOLERANCE);
  }

  @Test
  void aNegativeEigenvalueLeavesNoRealGenerator() {
    double[][] annual = expected("no_real_generator", "probability_per_year");
    MatrixRoot root = MatrixRoot.of(annual, MONTH);
    assertEquals(RootVerdict.NO_REAL_LOGARITHM, root.verdict());
    assertTrue(MatrixLogarithm.of(annual).isEmpty());
    assertTrue(root.principal().isEmpty());
    assertTrue(root.nearest(Regularisation.QUASI_OPTIMISATION).isEmpty());
    assertTrue(Double.isNaN(root.smallestEntry()));
  }

  private static double[][] divided(double[][] matrix, double by) {
    return Arrays.stream(matrix)
        .map(row -> Arrays.stream(row).map(entry -> entry / by).toArray())
        .toArray(double[][]::new);
  }

  private static double[][] expected(String name, String what) {
    List<Reference.Row> rows =
        ROWS.stream()
            .filter(row -> row.text("case").equals(name) && row.text("what").equals(what))
            .toList();
    int size = (int) Math.round(Math.sqrt(rows.size()));
    double[][] matrix = new double[size][size];
    rows.forEach(
        row -> matrix[row.integer("row") - 1][row.integer("col") - 1] = row.number("value"));
    return matrix;
  }

  private static void assertMatrix(double[][] expected, double[][] ours) {
    assertEquals(expected.length, ours.length);
    for (int i = 0; i < expected.length; i++) {
      assertArrayEquals(expected[i], ours[i], TOLERANCE);
    }
  }
}
