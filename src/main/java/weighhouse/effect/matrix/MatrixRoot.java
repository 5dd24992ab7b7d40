package weighhouse.effect.matrix;

import java.util.Arrays;
import java.util.Optional;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * A transition matrix carried to a shorter cycle (or, as a power, to another one): {@code
 * P^fraction = exp(fraction * log P)}, and whether that is a transition matrix.
 *
 * <p>Only the principal root is looked at; a matrix may have others. Sources: chhatwal-2016,
 * jahn-2019.
 */
public final class MatrixRoot {
  /** Negative entries down to this are rounding. */
  private static final double ROUNDING = 1e-12;

  private final double[][] matrix;
  private final double fraction;
  private final RootVerdict verdict;
  private final double[][] root;

  private MatrixRoot(double[][] matrix, double fraction, RootVerdict verdict, double[][] root) {
    this.matrix = matrix;
    this.fraction = fraction;
    this.verdict = verdict;
    this.root = root;
  }

  /**
   * The root of a matrix of transition probabilities.
   *
   * @param matrix over one old cycle, rows summing to 1
   * @param fraction new cycle length in old cycles, above 0: 1/12.0 from years to months
   */
  public static MatrixRoot of(double[][] matrix, double fraction) {
    RealMatrix p = Square.of(matrix);
    Optional<RealMatrix> log = MatrixLogarithm.of(p);
    if (log.isEmpty()) {
      return new MatrixRoot(p.getData(), fraction, whyNone(p), null);
    }
    double[][] root = MatrixExponential.of(log.get().scalarMultiply(fraction)).getData();
    RootVerdict verdict =
        smallest(root) < -ROUNDING ? RootVerdict.NEGATIVE_ENTRIES : RootVerdict.VALID;
    return new MatrixRoot(p.getData(), fraction, verdict, root);
  }

  private static RootVerdict whyNone(RealMatrix p) {
    return switch (Eigenvalues.of(p)) {
      case NEGATIVE -> RootVerdict.NO_REAL_LOGARITHM;
      case ZERO -> RootVerdict.SINGULAR;
      default -> RootVerdict.NOT_CALCULATED;
    };
  }

  public RootVerdict verdict() {
    return verdict;
  }

  /** The principal root as it comes, negative entries and all; empty where there is none. */
  public Optional<double[][]> principal() {
    return Optional.ofNullable(root).map(MatrixRoot::copy);
  }

  /** The root where it is a transition matrix, otherwise empty. */
  public Optional<double[][]> valid() {
    return verdict == RootVerdict.VALID ? principal() : Optional.empty();
  }

  /** Smallest entry of the principal root; NaN where there is none. */
  public double smallestEntry() {
    return root == null ? Double.NaN : smallest(root);
  }

  /**
   * A transition matrix in place of a root that is none, and by how much it misses.
   *
   * @return empty where there is no real root to start from
   */
  public Optional<NearestRoot> nearest(Regularisation method) {
    return principal()
        .map(r -> NearestRoot.of(matrix, fraction, method.apply(matrix, fraction, r)));
  }

  private static double smallest(double[][] entries) {
    return Arrays.stream(entries).flatMapToDouble(Arrays::stream).min().orElseThrow();
  }

  private static double[][] copy(double[][] entries) {
    return Arrays.stream(entries).map(double[]::clone).toArray(double[][]::new);
  }
}
