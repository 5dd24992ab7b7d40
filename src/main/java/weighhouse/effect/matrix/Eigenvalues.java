package weighhouse.effect.matrix;

import org.apache.commons.math3.exception.MaxCountExceededException;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/** Which functions a matrix can have, from where its eigenvalues lie. */
enum Eigenvalues {
  /** None at or left of zero: logarithm and roots exist and are real. */
  AWAY_FROM_NEGATIVE,
  /** One of them is negative and real. */
  NEGATIVE,
  /** One of them is 0, as far as rounding can tell. */
  ZERO,
  /** The decomposition did not converge. */
  UNKNOWN;

  private static final double NO_SIZE = 1e-12;

  static Eigenvalues of(RealMatrix matrix) {
    try {
      EigenDecomposition eigen = new EigenDecomposition(matrix);
      return classify(eigen.getRealEigenvalues(), eigen.getImagEigenvalues());
    } catch (ArithmeticException | MaxCountExceededException failure) {
      return UNKNOWN;
    }
  }

  private static Eigenvalues classify(double[] real, double[] imaginary) {
    Eigenvalues found = AWAY_FROM_NEGATIVE;
    for (int i = 0; i < real.length; i++) {
      if (Math.hypot(real[i], imaginary[i]) < NO_SIZE) {
        return ZERO;
      }
      if (real[i] < 0 && Math.abs(imaginary[i]) < NO_SIZE) {
        found = NEGATIVE;
      }
    }
    return found;
  }
}
