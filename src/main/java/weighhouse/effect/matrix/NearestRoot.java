package weighhouse.effect.matrix;

import java.util.Arrays;
import org.apache.commons.math3.linear.RealMatrix;

/** A transition matrix that stands in for a root that is none, and by how much it misses. */
public final class NearestRoot {
  private final double[][] candidate;
  private final RealMatrix miss;

  private NearestRoot(double[][] candidate, RealMatrix miss) {
    this.candidate = candidate;
    this.miss = miss;
  }

  static NearestRoot of(double[][] original, double fraction, double[][] candidate) {
    return new NearestRoot(candidate, power(candidate, 1 / fraction).subtract(Square.of(original)));
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

  /** Transition probabilities over the new cycle. */
  public double[][] matrix() {
    return Arrays.stream(candidate).map(double[]::clone).toArray(double[][]::new);
  }

  /** Largest difference, in size, between its power over the old cycle and the old matrix. */
  public double largestMiss() {
    return Square.largest(miss);
  }

  /** Square root of the sum of the squared differences. */
  public double totalMiss() {
    return miss.getFrobeniusNorm();
  }
}
