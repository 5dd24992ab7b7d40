package weighhouse.effect;

/**
 * Compound discounting, so that discount rates are not taken for rates of events. Rates above -1,
 * otherwise NaN.
 *
 * <p>Source: the compound rule, common practice.
 */
public final class Discounting {
  private Discounting() {}

  /** Factor on a value that comes after so many periods: {@code (1 + rate)^-periods}. */
  public static double factor(double rate, double periods) {
    return rate > -1 ? Math.exp(-periods * Math.log1p(rate)) : Double.NaN;
  }

  /**
   * The rate per shorter or longer period: {@code (1 + rate)^(to/from) - 1}.
   *
   * @param from length of the given rate's period, above 0
   * @param to length of the period asked for, at least 0
   */
  public static double rescale(double rate, double from, double to) {
    return rate > -1 && Domain.isPositive(from)
        ? Math.expm1(to / from * Math.log1p(rate))
        : Double.NaN;
  }
}
