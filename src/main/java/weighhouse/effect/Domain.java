package weighhouse.effect;

/** Where the field's quantities are defined. NaN is in no domain. */
public final class Domain {
  private Domain() {}

  /** Whether the number lies in [0, 1]. */
  public static boolean isProbability(double number) {
    return number >= 0 && number <= 1;
  }

  /** Whether the number is at least 0; infinity counts. */
  public static boolean isNonNegative(double number) {
    return number >= 0;
  }

  /** Whether the number is above 0 and finite. */
  public static boolean isPositive(double number) {
    return number > 0 && number < Double.POSITIVE_INFINITY;
  }
}
