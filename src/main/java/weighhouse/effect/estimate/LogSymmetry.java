package weighhouse.effect.estimate;

import java.math.BigDecimal;

/**
 * Whether a printed ratio lies where its interval says: at the geometric mean of its limits, as far
 * as rounding can tell.
 *
 * @param holds whether some unrounded figures behind the printed ones agree
 * @param estimate what the ratio would have to be, the limits being right: {@code sqrt(lower *
 *     upper)}
 * @param lower what the lower limit would have to be, the others being right: {@code ratio^2 /
 *     upper}
 * @param upper what the upper limit would have to be: {@code ratio^2 / lower}
 */
public record LogSymmetry(boolean holds, double estimate, double lower, double upper) {

  /**
   * Compares {@code ratio} with {@code sqrt(lower * upper)}, each figure standing for all numbers
   * that round to it.
   *
   * @param decimals digits after the point that the figures were printed with
   * @return does not hold for figures that are not above 0
   */
  public static LogSymmetry of(double ratio, double lower, double upper, int decimals) {
    // A hair more than half a unit, so that ties that rounded either way are let pass.
    double half = 0.5000001 * Math.pow(10, -decimals);
    double least = Math.sqrt(Math.max(lower - half, 0) * Math.max(upper - half, 0));
    double most = Math.sqrt((lower + half) * (upper + half));
    boolean holds = lower > 0 && ratio > 0 && ratio + half >= least && ratio - half <= most;
    return new LogSymmetry(
        holds, Math.sqrt(lower * upper), ratio * ratio / upper, ratio * ratio / lower);
  }

  /** The same with as many decimals as the most precise of the three shows. */
  public static LogSymmetry of(double ratio, double lower, double upper) {
    int decimals = Math.max(decimals(ratio), Math.max(decimals(lower), decimals(upper)));
    return of(ratio, lower, upper, decimals);
  }

  /** Digits after the point in the shortest decimal text of a number; 0 for NaN and infinity. */
  public static int decimals(double number) {
    return Double.isFinite(number)
        ? Math.max(0, BigDecimal.valueOf(number).stripTrailingZeros().scale())
        : 0;
  }
}
