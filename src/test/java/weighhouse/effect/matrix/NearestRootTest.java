package weighhouse.effect.matrix;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Stand-ins for the monthly root of the published HIV matrix, which has none that is valid. */
class NearestRootTest {
  private static final double[][] ANNUAL = {
    {0.721, 0.202, 0.067, 0.010}, {0, 0.581, 0.407, 0.012}, {0, 0, 0.750, 0.250}, {0, 0, 0, 1}
  };

  @ParameterizedTest
  @EnumSource(Regularisation.class)
  void standInsAreTransitionMatricesThatMissALittle(Regularisation method) {
    NearestRoot nearest = MatrixRoot.of(ANNUAL, 1 / 12.0).nearest(method).orElseThrow();
    for (double[] row : nearest.matrix()) {
      assertEquals(1, Arrays.stream(row).sum(), 1e-14);
      assertTrue(Arrays.stream(row).allMatch(p -> p >= 0 && p <= 1));
    }
    double byElement = missByElement();
    assertTrue(nearest.largestMiss() > 0.005 && nearest.largestMiss() < byElement);
    assertTrue(nearest.totalMiss() >= nearest.largestMiss());
    assertEquals(0, nearest.matrix()[3][0]);
  }

  private static double missByElement() {
    double[][] monthly = TransitionMatrix.elementByElement(ANNUAL, 1 / 12.0);
    return NearestRoot.of(ANNUAL, 1 / 12.0, monthly).largestMiss();
  }

  @Test
  void spansThatAreNoWholeNumberOfCyclesAreMeasuredToo() {
    MatrixRoot root = MatrixRoot.of(ANNUAL, 0.4);
    NearestRoot nearest = root.nearest(Regularisation.DIAGONAL_ADJUSTMENT).orElseThrow();
    assertTrue(nearest.largestMiss() > 0 && nearest.largestMiss() < 0.1);
  }

  @Test
  void theNearestRowTakesOneAmountOffEveryEntry() {
    double[] row = {0.7, 0.4, -0.1};
    assertArrayEquals(new double[] {0.65, 0.35, 0}, Simplex.nearest(row), 1e-15);
    assertArrayEquals(new double[] {1, 0}, Simplex.nearest(new double[] {3, 1}));
  }

  @Property(tries = 200)
  void noRowOfProbabilitiesIsNearer(
      @ForAll @Size(4) List<@DoubleRange(min = -0.5, max = 1) Double> entries,
      @ForAll @Size(4) List<@DoubleRange(min = 0.01, max = 1) Double> other) {
    double[] row = entries.stream().mapToDouble(v -> v).toArray();
    double sum = other.stream().mapToDouble(v -> v).sum();
    double[] probabilities = other.stream().mapToDouble(v -> v / sum).toArray();
    double nearest = distance(row, Simplex.nearest(row));
    assertTrue(nearest <= distance(row, probabilities) + 1e-12);
    assertEquals(1, Arrays.stream(Simplex.nearest(row)).sum(), 1e-12);
  }

  private static double distance(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += (a[i] - b[i]) * (a[i] - b[i]);
    }
    return Math.sqrt(sum);
  }
}
