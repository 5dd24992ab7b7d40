package weighhouse.workbook.ooxml;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.temporal.ChronoUnit;

/** Dates that strict files write out, as the numbers that Excel calculates with. */
final class IsoDates {
  private static final LocalDate DAY_0_OF_1904 = LocalDate.of(1904, 1, 1);
  private static final LocalDate DAY_0_OF_1900 = LocalDate.of(1899, 12, 30);
  private static final double NANOS_OF_DAY = 86_400e9;

  /** Before it Excel counts one day less, as it takes 1900 for a leap year. */
  private static final LocalDate MARCH_1900 = LocalDate.of(1900, 3, 1);

  private IsoDates() {}

  /** Days since day 0, or NaN where the text is no date or time of ISO 8601. */
  static double serial(String text, boolean date1904) {
    String plain = text.endsWith("Z") ? text.substring(0, text.length() - 1) : text;
    try {
      if (plain.indexOf('-') < 0) {
        return LocalTime.parse(plain).toNanoOfDay() / NANOS_OF_DAY;
      }
      LocalDateTime moment =
          plain.indexOf('T') < 0
              ? LocalDate.parse(plain).atStartOfDay()
              : LocalDateTime.parse(plain);
      double part = moment.toLocalTime().toNanoOfDay() / NANOS_OF_DAY;
      return days(moment.toLocalDate(), date1904) + part;
    } catch (DateTimeException e) {
      return Double.NaN;
    }
  }

  private static long days(LocalDate date, boolean date1904) {
    if (date1904) {
      return ChronoUnit.DAYS.between(DAY_0_OF_1904, date);
    }
    long days = ChronoUnit.DAYS.between(DAY_0_OF_1900, date);
    return date.isBefore(MARCH_1900) ? days - 1 : days;
  }
}
