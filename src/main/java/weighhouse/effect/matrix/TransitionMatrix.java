package weighhouse.effect.matrix;

import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularMatrixException;
import weighhouse.effect.Probability;

/**
 * Transition probabilities over one cycle: powers, expected visits, and the rescaling of entries
 * one by one that workbooks do.
 */
public final class TransitionMatrix {
  private TransitionMatrix() {}

  /**
   * Probabilities over several cycles.
   *
   * @param cycles at least 0
   */
  public static double[][] power(double[][] matrix, int cycles) {
    return Square.of(matrix).power(cycles).getData();
  }

  /** Occupancy one cycle on: {@code occupancy * P}. */
  public static double[] next(double[] occupancy, double[][] matrix) {
    return Square.of(matrix).preMultiply(occupancy);
  }

  /**
   * Expected cycles in each transient state: {@code (I - Q)^-1}.
   *
   * @param transientStates rows and columns of the states that are left for good in the end
   * @throws IllegalArgumentException where some of them are never left
   */
  public static double[][] fundamental(double[][] transientStates) {
    RealMatrix q = Square.of(transientStates);
    RealMatrix left = Square.identity(q.getRowDimension()).subtract(q);
    try {
      return new LUDecomposition(left).getSolver().getInverse().getData();
    } catch (SingularMatrixException e) {
      throw new IllegalArgumentException("Some of these states are never left", e);
    }
  }

  /**
   * Every entry off the diagonal rescaled alone, {@code 1 - (1 - p)^fraction}, and the diagonal
   * made good: what should not be done with three states or more, to show what it gives
   * (chhatwal-2016, gidwani-russell-2020).
   *
   * @param fraction new cycle length in old cycles, at least 0
   */
  public static double[][] elementByElement(double[][] matrix, double fraction) {
    double[][] rescaled = Square.of(matrix).getData();
    for (int i = 0; i < rescaled.length; i++) {
      double stay = 1;
      for (int j = 0; j < rescaled.length; j++) {
        if (i != j) {
          rescaled[i][j] = Probability.rescale(rescaled[i][j], 1, fraction);
          stay -= rescaled[i][j];
        }
      }
      rescaled[i][i] = stay;
    }
    return rescaled;
  }
}
