package weighhouse.effect.matrix;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;

/** Arithmetic of square matrices that the rest of the package shares. */
final class Square {
  private Square() {}

  /** A copy to calculate with. */
  static RealMatrix of(double[][] entries) {
    int size = entries.length;
    if (size == 0) {
      throw new IllegalArgumentException("A matrix needs at least one row");
    }
    for (double[] row : entries) {
      if (row.length != size) {
        throw new IllegalArgumentException(
            "A matrix of " + size + " rows needs " + size + " columns, not " + row.length);
      }
      for (double entry : row) {
        if (!Double.isFinite(entry)) {
          throw new IllegalArgumentException("A matrix holds finite numbers, not " + entry);
        }
      }
    }
    return new Array2DRowRealMatrix(entries, true);
  }

  static RealMatrix identity(int size) {
    return MatrixUtils.createRealIdentityMatrix(size);
  }

  /** Largest entry in size. */
  static double largest(RealMatrix matrix) {
    double largest = 0;
    for (double[] row : matrix.getData()) {
      for (double entry : row) {
        largest = Math.max(largest, Math.abs(entry));
      }
    }
    return largest;
  }
}
