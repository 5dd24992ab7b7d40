package weighhouse.effect.matrix;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;

/** Laws of generators and roots over matrices of any make. */
class MatrixLawsTest {

  private static double[][] generator(List<Double> rates) {
    double[][] q = new double[4][4];
    int next = 0;
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 4; j++) {
        if (i != j) {
          q[i][j] = rates.get(next++);
          q[i][i] -= q[i][j];
        }
      }
    }
    return q;
  }

  @Property(tries = 150)
  void spansCompose(
      @ForAll @Size(9) List<@DoubleRange(max = 0.5) Double> rates,
      @ForAll @DoubleRange(min = 0.05, max = 3) double span) {
    double[][] q = generator(rates);
    double[][] half = Generator.probabilities(q, span / 2);
    assertMatrix(Generator.probabilities(q, span), TransitionMatrix.power(half, 2), 1e-13);
    for (double[] row : half) {
      assertEquals(1, Arrays.stream(row).sum(), 1e-13);
    }
  }

  @Property(tries = 150)
  void theLogarithmGivesTheGeneratorBack(
      @ForAll @Size(9) List<@DoubleRange(max = 0.3) Double> rates) {
    double[][] q = generator(rates);
    double[][] p = Generator.probabilities(q, 1);
    assertMatrix(q, MatrixLogarithm.of(p).orElseThrow(), 1e-9);
    MatrixRoot root = MatrixRoot.of(p, 0.25);
    assertEquals(RootVerdict.VALID, root.verdict());
    assertMatrix(Generator.probabilities(q, 0.25), root.valid().orElseThrow(), 1e-9);
  }

  @Property(tries = 50)
  void aRatioOfOneLeavesTheGenerator(@ForAll @Size(9) List<@DoubleRange(max = 0.5) Double> rates) {
    double[][] q = generator(rates);
    assertMatrix(q, Generator.scaleEntering(q, 3, 1), 0);
    double[][] fewer = Generator.probabilities(Generator.scaleEntering(q, 3, 0.5), 1);
    assertTrue(fewer[0][3] <= Generator.probabilities(q, 1)[0][3] + 1e-15);
  }

  @Example
  void tooFewEigenvectorsAreNoHindrance() {
    double[][] q = {{-0.2, 0.2, 0}, {0, -0.2, 0.2}, {0, 0, 0}};
    double[][] log = MatrixLogarithm.of(Generator.probabilities(q, 1)).orElseThrow();
    assertMatrix(q, log, 1e-11);
    assertEquals(0.2 * Math.exp(-0.2), Generator.secondOfThree(0.2, 0, 0.2), 1e-15);
  }

  @Example
  void complexEigenvaluesAreNoHindrance() {
    double[][] q = {{-1, 1, 0}, {0, -1, 1}, {1, 0, -1}};
    double[][] log = MatrixLogarithm.of(Generator.probabilities(q, 1)).orElseThrow();
    assertMatrix(q, log, 1e-11);
  }

  @Example
  void largeRatesAreScaledDown() {
    double[][] q = {{-300, 300}, {100, -100}};
    double[][] p = Generator.probabilities(q, 2);
    assertMatrix(new double[][] {{0.25, 0.75}, {0.25, 0.75}}, p, 1e-12);
  }

  @Example
  void aSingularMatrixIsNamedSo() {
    double[][] p = {{0.5, 0.5}, {0.5, 0.5}};
    assertEquals(RootVerdict.SINGULAR, MatrixRoot.of(p, 0.5).verdict());
  }

  @Example
  void matricesOfTheWrongMakeAreRefused() {
    assertThrows(
        IllegalArgumentException.class, () -> MatrixExponential.of(new double[][] {{1, 2}}));
    assertThrows(IllegalArgumentException.class, () -> MatrixExponential.of(new double[0][]));
    assertThrows(
        IllegalArgumentException.class, () -> MatrixExponential.of(new double[][] {{1 / 0.0}}));
    assertThrows(
        IllegalArgumentException.class, () -> TransitionMatrix.fundamental(new double[][] {{1}}));
  }

  private static void assertMatrix(double[][] expected, double[][] ours, double tolerance) {
    for (int i = 0; i < expected.length; i++) {
      assertArrayEquals(expected[i], ours[i], tolerance);
    }
  }
}
