package weighhouse.recalculate.functions;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Days as numbers. In the 1900 system day 1 is 1 January 1900 and day 60 is 29 February 1900, a day
 * that never was; in the 1904 system day 0 is 1 January 1904.
 */
final class Dates {
  private static final LocalDate BEFORE_1900 = LocalDate.of(1899, 12, 31);
  private static final LocalDate START_1904 = LocalDate.of(1904, 1, 1);
  private static final int PHANTOM = 60;
  private static final int LAST = 2958465;
  private static final Pattern ISO = Pattern.compile("(\\d{4})[-/](\\d{1,2})[-/](\\d{1,2})");
  private static final Pattern TIME =
      Pattern.compile("(?:(.+?)\\s+)?(\\d{1,2}):(\\d{2})(?::(\\d{2}(?:\\.\\d+)?))?");

  private Dates() {}

  /** Year, month and day of a date number; the phantom day keeps its parts. */
  record Parts(int year, int month, int day) {}

  static Parts parts(double number, boolean date1904) {
    double day = Math.floor(number);
    if (day < 0 || day > LAST) {
      throw Fault.NUM.exception();
    }
    if (!date1904 && day == PHANTOM) {
      return new Parts(1900, 2, 29);
    }
    if (!date1904 && day == 0) {
      return new Parts(1900, 1, 0);
    }
    LocalDate date = date(number, date1904);
    return new Parts(date.getYear(), date.getMonthValue(), date.getDayOfMonth());
  }

  static LocalDate date(double number, boolean date1904) {
    long day = (long) Math.floor(number);
    if (day < 0 || day > LAST) {
      throw Fault.NUM.exception();
    }
    if (date1904) {
      return START_1904.plusDays(day);
    }
    return BEFORE_1900.plusDays(day > PHANTOM ? day - 1 : Math.min(day, PHANTOM - 1));
  }

  static double number(LocalDate date, boolean date1904) {
    if (date1904) {
      return ChronoUnit.DAYS.between(START_1904, date);
    }
    long day = ChronoUnit.DAYS.between(BEFORE_1900, date);
    return day >= PHANTOM ? day + 1 : day;
  }

  /** A date or time of day written as text, in the 1900 system, or NaN. */
  static double parse(String text) {
    Matcher time = TIME.matcher(text);
    if (time.matches()) {
      double seconds = time.group(4) == null ? 0 : Double.parseDouble(time.group(4));
      double hours = Integer.parseInt(time.group(2)) + Integer.parseInt(time.group(3)) / 60.0;
      double day = time.group(1) == null ? 0 : parse(time.group(1));
      return day + (hours + seconds / 3600) / 24;
    }
    Matcher iso = ISO.matcher(text);
    if (!iso.matches()) {
      return Double.NaN;
    }
    try {
      int year = Integer.parseInt(iso.group(1));
      int month = Integer.parseInt(iso.group(2));
      return number(LocalDate.of(year, month, Integer.parseInt(iso.group(3))), false);
    } catch (DateTimeException e) {
      return Double.NaN;
    }
  }
}
