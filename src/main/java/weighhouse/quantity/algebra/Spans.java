package weighhouse.quantity.algebra;

import java.util.List;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;

/** Arithmetic on lengths of time. */
public final class Spans {
  private static final List<Double> CONVERSIONS =
      List.of(12.0, 52.0, 365.0, 365.25, 365.25 / 7, 30.4375);

  private static final double CLOSE = 0.004;
  private static final List<Double> PER_YEAR =
      List.of(12.0, 52.0, 365.0, 365.25, 4.0, 2.0, 24.0, 26.0, 13.0, 52.18, 52.1429);
  private static final Span CYCLE = Span.of(1, TimeUnit.CYCLE);

  private Spans() {}

  /** One cycle of the model. */
  public static Span cycle() {
    return CYCLE;
  }

  /** The span so many times as long, in the unit people would use; null where unknown. */
  public static Span times(Span span, double factor) {
    if (span == null || !(factor > 0) || Double.isInfinite(factor)) {
      return null;
    }
    if (span.unit() == TimeUnit.CYCLE && isConversion(factor)) {
      return span; // the cycle's length was given in another unit than the rate's
    }
    return span.unit() == TimeUnit.CYCLE
        ? new Span(span.amount() * factor, TimeUnit.CYCLE, span.people())
        : inPlainUnit(span.years() * factor, span.people());
  }

  /** Months, weeks or days of a year. */
  private static boolean isConversion(double factor) {
    double whole = factor < 1 ? 1 / factor : factor;
    return CONVERSIONS.stream().anyMatch(c -> Math.abs(c - whole) < 1e-6 * c);
  }

  private static Span inPlainUnit(double years, double people) {
    for (TimeUnit unit : List.of(TimeUnit.YEAR, TimeUnit.MONTH, TimeUnit.WEEK, TimeUnit.DAY)) {
      double amount = years / unit.years();
      double whole = Math.rint(amount);
      if (whole >= 1 && Math.abs(amount - whole) <= CLOSE * whole) {
        return new Span(whole, unit, people);
      }
    }
    return new Span(years, TimeUnit.YEAR, people);
  }

  /** Whether two spans are as long, as far as both tell in the same measure. */
  public static boolean same(Span a, Span b) {
    if (a == null || b == null) {
      return a == null && b == null;
    }
    if (a.unit() == TimeUnit.CYCLE || b.unit() == TimeUnit.CYCLE) {
      return a.equals(b);
    }
    return a.people() == b.people() && Math.abs(a.years() / b.years() - 1) < CLOSE;
  }

  /** What both tell; null where they differ. */
  static Span common(Span a, Span b) {
    return a == null ? b : b == null || same(a, b) ? a : null;
  }

  /**
   * By what a factor stretches time, where it is a conversion of units of time; NaN where it is any
   * other number.
   */
  static double conversion(Term factor) {
    if (factor.is(Kind.CYCLES_PER_YEAR) || factor.is(Kind.CYCLE_LENGTH)) {
      return factor.value();
    }
    double value = factor.value();
    for (double perYear : PER_YEAR) {
      if (Math.abs(value / perYear - 1) < CLOSE || Math.abs(value * perYear - 1) < CLOSE) {
        return value;
      }
    }
    return Double.NaN;
  }

  /** The span of something for a year, turned to the model's cycle by its length or number. */
  static Span perCycle(Span span) {
    boolean year = span == null || (span.unit() == TimeUnit.YEAR && span.amount() == 1);
    return year ? CYCLE : null;
  }
}
