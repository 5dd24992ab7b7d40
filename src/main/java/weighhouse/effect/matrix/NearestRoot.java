package weighhouse.effect.matrix;

import java.util.Arrays;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * A transition matrix that stands in for a root that is none.
 *
 * @param matrix transition probabilities over the new cycle
 * @param largestMiss largest difference, in size, between its power over the old cycle and the old
 *     matrix
 * @param totalMiss square root of the sum of squared differences
 */
public record NearestRoot(double[][] matrix, double largestMiss, double totalMiss) {

  static NearestRoot of(double[][] original, double fraction, double[][] candidate) {
    RealMatrix difference =
        power(candidate, 1 / fraction).subtract(Square.of(original));
    return new NearestRoot(
        candidate, Square.largest(difference), difference.getFrobeniusNorm());
  }

  private static RealMatrix power(double[][] candidate, double cycles) {
    long whole = Math.round(cycles);
    if (Math.abs(cycles - whole) < 1e-9) {
      return Square.of(candidate).power((int) whole);
    }
    return MatrixLogarithm.of(Square.of(candidate))
        .map(log -> MatrixExponential.of(log.scalarMultiply(cycles)))
        .orElseThrow(() -> new IllegalArgumentException("No power of " + cycles + " cycles"));
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof NearestRoot that
        && Arrays.deepEquals(matrix, that.matrix)
        && largestMiss == that.largestMiss
        && totalMiss == that.totalMiss;
  }

  @Override
  public int hashCode() {
    return Arrays.deepHashCode(matrix);
  }
}
