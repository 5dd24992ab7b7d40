package weighhouse.recalculate.functions;

import java.math.BigDecimal;
import java.math.RoundingMode;
import weighhouse.recalculate.Value;

/** Rounding, whole parts and remainders. */
final class RoundingFunctions {
  /** Digits that a double holds; more than these change nothing. */
  private static final int DIGITS = 300;

  private RoundingFunctions() {}

  static void enter(Entries entries) {
    entries.number("INT", RoundingFunctions::floor);
    entries.number("EVEN", x -> Math.signum(x) * 2 * Math.ceil(Math.abs(x) / 2));
    entries.number("ODD", x -> x < 0 ? -odd(-x) : odd(x));
    entries.numbers("ROUND", (x, digits) -> round(x, digits, RoundingMode.HALF_UP));
    entries.numbers("ROUNDUP", (x, digits) -> round(x, digits, RoundingMode.UP));
    entries.numbers("ROUNDDOWN", (x, digits) -> round(x, digits, RoundingMode.DOWN));
    entries.general(
        "TRUNC", "Vv", a -> Coerce.of(round(a.number(0), a.number(1, 0), RoundingMode.DOWN)));
    entries.general("MOD", "VV", a -> mod(a.number(0), a.number(1)));
    entries.general("QUOTIENT", "VV", a -> quotient(a.number(0), a.number(1)));
    entries.general("MROUND", "VV", a -> mround(a.number(0), a.number(1)));
    multiples(entries);
  }

  private static void multiples(Entries entries) {
    entries.general("CEILING", "VV", a -> classic(a.number(0), a.number(1), true));
    entries.general("FLOOR", "VV", a -> classic(a.number(0), a.number(1), false));
    entries.general(
        "CEILING.MATH", "Vvv", a -> modern(a.number(0), a.number(1, 1), a.number(2, 0), true));
    entries.general(
        "FLOOR.MATH", "Vvv", a -> modern(a.number(0), a.number(1, 1), a.number(2, 0), false));
    entries.general("CEILING.PRECISE", "Vv", a -> modern(a.number(0), a.number(1, 1), 0, true));
    entries.general("FLOOR.PRECISE", "Vv", a -> modern(a.number(0), a.number(1, 1), 0, false));
    entries.alias("CEILING.PRECISE", "ISO.CEILING");
  }

  private static double floor(double x) {
    double floor = Math.floor(x);
    // 0.1 * 30 is a bit below 3, which Excel shows and floors as 3
    return nearly(x, floor + 1) ? floor + 1 : floor;
  }

  private static boolean nearly(double x, double whole) {
    return x != whole && Math.abs(x - whole) <= Math.ulp(whole) * 2 && whole != 0;
  }

  private static double odd(double x) {
    return Math.max(1, 2 * Math.ceil((x - 1) / 2) + 1);
  }

  /** Rounds in decimal, on the 15 digits that Excel shows. */
  static double round(double x, double digits, RoundingMode mode) {
    int places = (int) Math.max(-DIGITS, Math.min(DIGITS, digits));
    if (x == 0 || Double.isInfinite(x) || Double.isNaN(x) || places > 20) {
      return x;
    }
    BigDecimal shown = new BigDecimal(x).round(new java.math.MathContext(15, RoundingMode.HALF_UP));
    return shown.setScale(places, mode).doubleValue();
  }

  private static Value mod(double x, double divisor) {
    if (divisor == 0) {
      throw Fault.DIV0.exception();
    }
    double quotient = x / divisor;
    double rest = x - divisor * floor(quotient);
    return Coerce.of(Math.abs(rest) < Math.ulp(x) ? 0 : rest);
  }

  private static Value quotient(double x, double divisor) {
    if (divisor == 0) {
      throw Fault.DIV0.exception();
    }
    double quotient = x / divisor;
    return Coerce.of(quotient < 0 ? Math.ceil(quotient) : Math.floor(quotient));
  }

  private static Value mround(double x, double multiple) {
    if (multiple == 0) {
      return Coerce.of(0);
    }
    if (x * multiple < 0) {
      throw Fault.NUM.exception();
    }
    double times = round(x / multiple, 0, RoundingMode.HALF_UP);
    return Coerce.of(times * multiple);
  }

  private static Value classic(double x, double multiple, boolean up) {
    if (multiple == 0) {
      return up || x == 0 ? Coerce.of(0) : Fault.DIV0.value();
    }
    if (x > 0 && multiple < 0) {
      throw Fault.NUM.exception();
    }
    return Coerce.of(multiple * whole(x / multiple, up));
  }

  private static Value modern(double x, double multiple, double mode, boolean up) {
    double step = Math.abs(multiple);
    if (step == 0) {
      return Coerce.of(0);
    }
    boolean upwards = up != (x < 0 && mode != 0);
    return Coerce.of(step * whole(x / step, upwards));
  }

  private static double whole(double times, boolean up) {
    double nearest = Math.rint(times);
    if (nearly(times, nearest)) {
      return nearest;
    }
    return up ? Math.ceil(times) : Math.floor(times);
  }
}
