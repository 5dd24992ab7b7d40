package weighhouse.effect.matrix;

import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * Logarithm by inverse scaling and squaring: square roots (Denman-Beavers iteration) until the
 * matrix is near the identity, then the series of {@code 2 artanh(X)} with {@code X = (A - I)(A +
 * I)^-1}.
 */
final class SquareRoots {
  private static final double NEAR_IDENTITY = 0.05;
  private static final int MOST_ROOTS = 40;
  private static final int MOST_STEPS = 60;
  private static final int TERMS = 9;

  private SquareRoots() {}

  static RealMatrix logarithm(RealMatrix matrix) {
    RealMatrix identity = Square.identity(matrix.getRowDimension());
    RealMatrix root = matrix;
    int roots = 0;
    while (root.subtract(identity).getNorm() > NEAR_IDENTITY && roots < MOST_ROOTS) {
      root = squareRoot(root);
      roots++;
    }
    RealMatrix x = root.subtract(identity).multiply(inverse(root.add(identity)));
    return series(x).scalarMultiply(Math.scalb(2.0, roots));
  }

  private static RealMatrix series(RealMatrix x) {
    RealMatrix square = x.multiply(x);
    RealMatrix power = x;
    RealMatrix sum = x;
    for (int k = 1; k < TERMS; k++) {
      power = power.multiply(square);
      sum = sum.add(power.scalarMultiply(1.0 / (2 * k + 1)));
    }
    return sum;
  }

  private static RealMatrix squareRoot(RealMatrix matrix) {
    RealMatrix root = matrix;
    RealMatrix inverseRoot = Square.identity(matrix.getRowDimension());
    for (int step = 0; step < MOST_STEPS; step++) {
      RealMatrix next = root.add(inverse(inverseRoot)).scalarMultiply(0.5);
      inverseRoot = inverseRoot.add(inverse(root)).scalarMultiply(0.5);
      double change = Square.largest(next.subtract(root));
      root = next;
      if (change < 1e-16 * Square.largest(root)) {
        break;
      }
    }
    return root;
  }

  private static RealMatrix inverse(RealMatrix matrix) {
    return new LUDecomposition(matrix, 0).getSolver().getInverse();
  }
}
