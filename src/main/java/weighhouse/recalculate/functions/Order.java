package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;

/**
 * Excel's order of values: numbers before text before truth values; text without regard to case.
 */
public final class Order {
  /** Numbers that agree to about 15 digits compare as equal. */
  private static final double ROUNDING = 0x1p-49;

  private Order() {}

  /** Negative, 0 or positive as the first value sorts before, with or after the second. */
  public static int compare(Value a, Value b) {
    int rank = rank(a, b);
    int other = rank(b, a);
    if (rank != other) {
      return Integer.compare(rank, other);
    }
    return switch (rank) {
      case 1 -> compare(a.number(), b.number());
      case 2 -> text(a).compareToIgnoreCase(text(b));
      default -> Boolean.compare(truth(a), truth(b));
    };
  }

  public static boolean equal(Value a, Value b) {
    return compare(a, b) == 0;
  }

  /** Order of two numbers, as Excel compares them. */
  public static int compare(double a, double b) {
    if (a == b || Math.abs(a - b) < Math.abs(a) * ROUNDING) {
      return 0;
    }
    return a < b ? -1 : 1;
  }

  /** A blank takes the kind of what it is compared with. */
  private static int rank(Value value, Value other) {
    if (value instanceof Value.Blank) {
      return other instanceof Value.Blank ? 1 : rank(other, other);
    }
    return value instanceof Value.Num ? 1 : value instanceof Value.Text ? 2 : 3;
  }

  private static String text(Value value) {
    return value instanceof Value.Text t ? t.value() : "";
  }

  private static boolean truth(Value value) {
    return value instanceof Value.Logical l && l.value();
  }
}
