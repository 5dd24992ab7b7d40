package weighhouse.effect.matrix;

import java.util.Optional;
import org.apache.commons.math3.exception.MaxCountExceededException;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularMatrixException;

/**
 * Principal logarithm of a matrix: by its eigenvectors where they are well conditioned, otherwise
 * (matrices with too few of them, such as equal stays in a chain) by repeated square roots.
 *
 * <p>Source: Higham NJ, Functions of Matrices, SIAM 2008 (from memory). Each result is held against
 * the matrix by its exponential; one that misses it by more than 1e-10 is not given.
 */
public final class MatrixLogarithm {
  private static final double EIGENVECTORS_GOOD = 1e-13;
  private static final double ROOTS_GOOD = 1e-10;

  private MatrixLogarithm() {}

  /**
   * The principal logarithm L, with {@code exp(L) = A}.
   *
   * @return empty where the matrix has an eigenvalue that is 0 or real and negative (no real
   *     principal logarithm), or where neither way reaches 1e-10
   */
  public static Optional<double[][]> of(double[][] matrix) {
    return of(Square.of(matrix)).map(RealMatrix::getData);
  }

  static Optional<RealMatrix> of(RealMatrix matrix) {
    Eigenvalues eigenvalues = Eigenvalues.of(matrix);
    if (eigenvalues == Eigenvalues.NEGATIVE || eigenvalues == Eigenvalues.ZERO) {
      return Optional.empty();
    }
    try {
      RealMatrix byEigenvectors = byEigenvectors(matrix);
      if (misses(byEigenvectors, matrix) < EIGENVECTORS_GOOD) {
        return Optional.of(byEigenvectors);
      }
    } catch (SingularMatrixException
        | ArithmeticException
        | MaxCountExceededException tooFewEigenvectors) {
      // The other way needs none.
    }
    try {
      return Optional.of(SquareRoots.logarithm(matrix))
          .filter(log -> misses(log, matrix) < ROOTS_GOOD);
    } catch (SingularMatrixException noRoots) {
      return Optional.empty();
    }
  }

  private static double misses(RealMatrix log, RealMatrix matrix) {
    double miss = Square.largest(MatrixExponential.of(log).subtract(matrix));
    return Double.isNaN(miss) ? Double.POSITIVE_INFINITY : miss;
  }

  /** Complex pairs stand as 2 by 2 blocks {@code (a b; -b a)}, whose logarithm is a block too. */
  private static RealMatrix byEigenvectors(RealMatrix matrix) {
    EigenDecomposition eigen = new EigenDecomposition(matrix);
    RealMatrix logs = eigen.getD().copy();
    double[] real = eigen.getRealEigenvalues();
    double[] imaginary = eigen.getImagEigenvalues();
    for (int i = 0; i < real.length; i++) {
      logs.setEntry(i, i, Math.log(Math.hypot(real[i], imaginary[i])));
      if (imaginary[i] > 0) {
        double angle = Math.atan2(imaginary[i], real[i]);
        logs.setEntry(i, i + 1, angle);
        logs.setEntry(i + 1, i, -angle);
      }
    }
    RealMatrix v = eigen.getV();
    RealMatrix inverse = new LUDecomposition(v).getSolver().getInverse();
    return v.multiply(logs).multiply(inverse);
  }
}
