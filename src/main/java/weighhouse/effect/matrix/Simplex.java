package weighhouse.effect.matrix;

import java.util.Arrays;

/** Rows of probabilities: entries of at least 0 that sum to 1. */
final class Simplex {
  private Simplex() {}

  /**
   * The row of probabilities nearest to a row: one amount taken off every entry, those that would
   * fall below 0 set to 0.
   */
  static double[] nearest(double[] row) {
    double[] falling = row.clone();
    Arrays.sort(falling);
    double sum = 0;
    double amount = 0;
    for (int kept = 1; kept <= row.length; kept++) {
      double entry = falling[row.length - kept];
      sum += entry;
      double candidate = (sum - 1) / kept;
      if (entry > candidate) {
        amount = candidate;
      }
    }
    double taken = amount;
    return Arrays.stream(row).map(entry -> Math.max(0, entry - taken)).toArray();
  }
}
