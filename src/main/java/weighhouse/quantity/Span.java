package weighhouse.quantity;

/**
 * The length of time that a probability, rate or cumulative hazard speaks of.
 *
 * @param amount how many units, above 0
 * @param unit the unit of time
 * @param people person-time denominator of a rate: 1, or 1000 in "per 1000 person-years"
 */
public record Span(double amount, TimeUnit unit, double people) {
  public static Span of(double amount, TimeUnit unit) {
    return new Span(amount, unit, 1);
  }

  /** Length in years; NaN where it is counted in cycles. */
  public double years() {
    return amount * unit.years();
  }
}
