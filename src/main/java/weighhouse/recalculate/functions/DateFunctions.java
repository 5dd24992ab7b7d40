package weighhouse.recalculate.functions;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.time.temporal.IsoFields;
import java.util.Locale;
import weighhouse.recalculate.Value;

/** Days, months and years. */
final class DateFunctions {
  private static final double SECONDS = 86400;

  private DateFunctions() {}

  static void enter(Entries entries) {
    entries.general("DATE", "VVV", DateFunctions::date);
    entries.general("YEAR", "V", a -> Coerce.of(parts(a, 0).year()));
    entries.general("MONTH", "V", a -> Coerce.of(parts(a, 0).month()));
    entries.general("DAY", "V", a -> Coerce.of(parts(a, 0).day()));
    entries.general("EDATE", "VV", a -> number(a, day(a, 0).plusMonths(a.integer(1))));
    entries.general(
        "EOMONTH", "VV", a -> number(a, endOfMonth(day(a, 0).plusMonths(a.integer(1)))));
    entries.general(
        "DAYS", "VV", a -> Coerce.of(Math.floor(a.number(0)) - Math.floor(a.number(1))));
    entries.general("DAYS360", "VVv", DateFunctions::days360);
    entries.general("DATEDIF", "VVV", DateFunctions::difference);
    entries.general(
        "YEARFRAC", "VVv", a -> Coerce.of(YearFraction.of(day(a, 0), day(a, 1), a.integer(2, 0))));
    entries.general("WEEKDAY", "Vv", DateFunctions::weekday);
    entries.general(
        "ISOWEEKNUM", "V", a -> Coerce.of(day(a, 0).get(IsoFields.WEEK_OF_WEEK_BASED_YEAR)));
    entries.general("DATEVALUE", "V", DateFunctions::dateValue);
    entries.general("TIME", "VVV", a -> Coerce.of(time(a)));
    entries.general("HOUR", "V", a -> Coerce.of((double) (seconds(a) / 3600 % 24)));
    entries.general("MINUTE", "V", a -> Coerce.of((double) (seconds(a) / 60 % 60)));
    entries.general("SECOND", "V", a -> Coerce.of((double) (seconds(a) % 60)));
  }

  private static boolean date1904(Arguments a) {
    return a.surroundings().workbook().date1904();
  }

  private static Dates.Parts parts(Arguments a, int index) {
    return Dates.parts(a.number(index), date1904(a));
  }

  private static LocalDate day(Arguments a, int index) {
    return Dates.date(a.number(index), date1904(a));
  }

  private static Value number(Arguments a, LocalDate date) {
    double number = Dates.number(date, date1904(a));
    return number < 0 ? Fault.NUM.value() : Coerce.of(number);
  }

  private static Value date(Arguments a) {
    int year = a.integer(0);
    int full = year < 1900 ? year + 1900 : year;
    if (year < 0 || full > 9999) {
      throw Fault.NUM.exception();
    }
    LocalDate first = LocalDate.of(full, 1, 1).plusMonths(a.integer(1) - 1L);
    double day = a.integer(2);
    if (!date1904(a) && first.equals(LocalDate.of(1900, 2, 1)) && day == 29) {
      return Coerce.of(60);
    }
    return number(a, first.plusDays((long) day - 1));
  }

  private static LocalDate endOfMonth(LocalDate date) {
    return date.withDayOfMonth(date.lengthOfMonth());
  }

  private static Value days360(Arguments a) {
    return Coerce.of((double) YearFraction.days360(day(a, 0), day(a, 1), a.logical(2, false)));
  }

  private static Value difference(Arguments a) {
    LocalDate from = day(a, 0);
    LocalDate to = day(a, 1);
    if (from.isAfter(to)) {
      throw Fault.NUM.exception();
    }
    long months = ChronoUnit.MONTHS.between(from, to);
    long years = ChronoUnit.YEARS.between(from, to);
    return switch (a.text(2).toUpperCase(Locale.ROOT)) {
      case "D" -> Coerce.of((double) ChronoUnit.DAYS.between(from, to));
      case "M" -> Coerce.of((double) months);
      case "Y" -> Coerce.of((double) years);
      case "YM" -> Coerce.of((double) (months % 12));
      case "MD" -> Coerce.of((double) ChronoUnit.DAYS.between(from.plusMonths(months), to));
      case "YD" -> Coerce.of((double) ChronoUnit.DAYS.between(from.plusYears(years), to));
      default -> Fault.NUM.value();
    };
  }

  private static Value weekday(Arguments a) {
    int kind = a.integer(1, 1);
    // day 1 of the 1900 system counts as a Sunday, which the phantom leap day puts right
    DayOfWeek day = Dates.date(a.number(0), date1904(a)).getDayOfWeek();
    int sunday = a.number(0) < 60 && !date1904(a) ? -1 : 0;
    int fromMonday = Math.floorMod(day.getValue() - 1 + sunday, 7);
    return switch (kind) {
      case 1, 17 -> Coerce.of((fromMonday + 1) % 7 + 1);
      case 2, 11 -> Coerce.of(fromMonday + 1);
      case 3 -> Coerce.of(fromMonday);
      case 12, 13, 14, 15, 16 -> Coerce.of(Math.floorMod(fromMonday - (kind - 11), 7) + 1);
      default -> Fault.NUM.value();
    };
  }

  private static Value dateValue(Arguments a) {
    double number = Dates.parse(a.text(0).strip());
    return Double.isNaN(number) ? Fault.VALUE.value() : Coerce.of(Math.floor(number));
  }

  private static double time(Arguments a) {
    double seconds = a.number(0) * 3600 + a.number(1) * 60 + a.number(2);
    return seconds < 0 ? Double.NaN : seconds / SECONDS % 1;
  }

  private static long seconds(Arguments a) {
    double number = a.number(0);
    if (number < 0) {
      throw Fault.NUM.exception();
    }
    return Math.round((number - Math.floor(number)) * SECONDS);
  }
}
