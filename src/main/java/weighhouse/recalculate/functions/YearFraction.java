package weighhouse.recalculate.functions;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;

/** Parts of a year between two days, by the day-count bases of YEARFRAC. */
final class YearFraction {
  private YearFraction() {}

  /**
   * @param basis 0 US 30/360, 1 actual/actual, 2 actual/360, 3 actual/365, 4 European 30/360
   */
  static double of(LocalDate one, LocalDate other, int basis) {
    LocalDate from = one.isAfter(other) ? other : one;
    LocalDate to = one.isAfter(other) ? one : other;
    double days = ChronoUnit.DAYS.between(from, to);
    return switch (basis) {
      case 0 -> days360(from, to, false) / 360.0;
      case 1 -> days / yearLength(from, to);
      case 2 -> days / 360;
      case 3 -> days / 365;
      case 4 -> days360(from, to, true) / 360.0;
      default -> throw Fault.NUM.exception();
    };
  }

  private static double yearLength(LocalDate from, LocalDate to) {
    if (!to.isAfter(from.plusYears(1))) {
      return within(from, to) ? 366 : 365;
    }
    int years = to.getYear() - from.getYear() + 1;
    LocalDate start = LocalDate.of(from.getYear(), 1, 1);
    return ChronoUnit.DAYS.between(start, start.plusYears(years)) / (double) years;
  }

  /** Whether a stretch of up to a year counts as one of a leap year. */
  private static boolean within(LocalDate from, LocalDate to) {
    if (from.getYear() == to.getYear()) {
      return from.isLeapYear();
    }
    boolean before = from.isLeapYear() && !from.isAfter(LocalDate.of(from.getYear(), 2, 29));
    boolean after = to.isLeapYear() && !to.isBefore(LocalDate.of(to.getYear(), 2, 29));
    return before || after;
  }

  static long days360(LocalDate from, LocalDate to, boolean european) {
    int first = from.getDayOfMonth();
    int last = to.getDayOfMonth();
    boolean endOfFebruary = from.getMonthValue() == 2 && first == from.lengthOfMonth();
    if (european) {
      first = Math.min(first, 30);
      last = Math.min(last, 30);
    } else {
      if (endOfFebruary && to.getMonthValue() == 2 && last == to.lengthOfMonth()) {
        last = 30;
      }
      first = endOfFebruary ? 30 : Math.min(first, 30);
      last = last == 31 && first == 30 ? 30 : last;
    }
    return 360L * (to.getYear() - from.getYear())
        + 30L * (to.getMonthValue() - from.getMonthValue())
        + last
        - first;
  }
}
