package weighhouse.effect.matrix;

import java.util.Arrays;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * Published ways to make a transition matrix of a root that has negative entries. Named from
 * memory.
 */
public enum Regularisation {
  /**
   * Each row of the root replaced by the nearest row of probabilities (Euclidean): the
   * quasi-optimization of the root matrix of Kreinin and Sidelnikova, Algo Research Quarterly
   * 2001;4:23-40.
   */
  QUASI_OPTIMISATION {
    @Override
    double[][] apply(double[][] matrix, double fraction, double[][] root) {
      return Arrays.stream(root).map(Simplex::nearest).toArray(double[][]::new);
    }
  },
  /**
   * Negative rates of the logarithm set to 0 and the diagonal made good: the diagonal adjustment of
   * Israel, Rosenthal and Wei, Mathematical Finance 2001;11:245-265.
   */
  DIAGONAL_ADJUSTMENT {
    @Override
    double[][] apply(double[][] matrix, double fraction, double[][] root) {
      return fromRates(matrix, fraction, Regularisation::adjustDiagonal);
    }
  },
  /**
   * Negative rates set to 0 and taken off the other entries of the row in proportion to their size:
   * the weighted adjustment of the same paper.
   */
  WEIGHTED_ADJUSTMENT {
    @Override
    double[][] apply(double[][] matrix, double fraction, double[][] root) {
      return fromRates(matrix, fraction, Regularisation::adjustWeighted);
    }
  };

  private interface RowAdjustment {
    void apply(double[] row, int diagonal, double negative);
  }

  abstract double[][] apply(double[][] matrix, double fraction, double[][] root);

  private static double[][] fromRates(double[][] matrix, double fraction, RowAdjustment adjust) {
    RealMatrix log = MatrixLogarithm.of(Square.of(matrix)).orElseThrow();
    double[][] rates = log.getData();
    for (int i = 0; i < rates.length; i++) {
      double negative = 0;
      for (int j = 0; j < rates.length; j++) {
        if (i != j && rates[i][j] < 0) {
          negative -= rates[i][j];
          rates[i][j] = 0;
        }
      }
      adjust.apply(rates[i], i, negative);
    }
    return Generator.probabilities(rates, fraction);
  }

  private static void adjustDiagonal(double[] row, int diagonal, double negative) {
    row[diagonal] -= negative;
  }

  private static void adjustWeighted(double[] row, int diagonal, double negative) {
    double size = Arrays.stream(row).map(Math::abs).sum();
    for (int j = 0; size > 0 && j < row.length; j++) {
      row[j] -= negative * Math.abs(row[j]) / size;
    }
  }
}
