package weighhouse.effect.matrix;

import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * Matrix exponential by scaling and squaring around the diagonal Pade approximant of order 13.
 *
 * <p>Source: Higham NJ, SIAM J Matrix Anal Appl 2005;26:1179-1193 (from memory). Error about 1e-15
 * times the size of the result for generators whose entries times the span are below 1000.
 */
public final class MatrixExponential {
  /** Norm up to which the approximant is exact to double precision. */
  private static final double RADIUS = 5.37;

  private static final double[] PADE = {
    64764752532480000.0,
    32382376266240000.0,
    7771770303897600.0,
    1187353796428800.0,
    129060195264000.0,
    10559470521600.0,
    670442572800.0,
    33522128640.0,
    1323241920.0,
    40840800.0,
    960960.0,
    16380.0,
    182.0,
    1.0
  };

  private MatrixExponential() {}

  /** {@code exp(A)} of any square matrix. */
  public static double[][] of(double[][] matrix) {
    return of(Square.of(matrix)).getData();
  }

  static RealMatrix of(RealMatrix matrix) {
    int squarings = Math.max(0, Math.getExponent(matrix.getNorm() / RADIUS) + 1);
    RealMatrix result = pade(matrix.scalarMultiply(Math.scalb(1.0, -squarings)));
    for (int i = 0; i < squarings; i++) {
      result = result.multiply(result);
    }
    return result;
  }

  private static RealMatrix pade(RealMatrix a) {
    RealMatrix a2 = a.multiply(a);
    RealMatrix even = Square.identity(a.getRowDimension()).scalarMultiply(PADE[0]);
    RealMatrix odd = Square.identity(a.getRowDimension()).scalarMultiply(PADE[1]);
    RealMatrix power = a2;
    for (int i = 2; i < PADE.length; i += 2) {
      even = even.add(power.scalarMultiply(PADE[i]));
      odd = odd.add(power.scalarMultiply(PADE[i + 1]));
      power = power.multiply(a2);
    }
    odd = a.multiply(odd);
    return new LUDecomposition(even.subtract(odd)).getSolver().solve(even.add(odd));
  }
}
