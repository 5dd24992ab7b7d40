package weighhouse.recalculate.functions;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.temporal.ChronoField;
import weighhouse.recalculate.Value;

/** Draws of random numbers, and the clock. */
final class RandomFunctions {
  private static final double SECONDS = 86400;

  private RandomFunctions() {}

  static void enter(Entries entries) {
    entries.drawing("RAND", "", a -> Coerce.of(a.surroundings().random()));
    entries.drawing("RANDBETWEEN", "VV", a -> between(a, a.number(0), a.number(1), true));
    entries.drawing("RANDARRAY", "vvvvv", RandomFunctions::array);
    entries.drawing("TODAY", "", a -> Coerce.of(today(a)));
    entries.drawing("NOW", "", a -> Coerce.of(today(a) + timeOfDay()));
  }

  private static double today(Arguments a) {
    return Dates.number(
        LocalDate.now(ZoneId.systemDefault()), a.surroundings().workbook().date1904());
  }

  private static double timeOfDay() {
    return LocalDateTime.now(ZoneId.systemDefault()).get(ChronoField.SECOND_OF_DAY) / SECONDS;
  }

  private static Value between(Arguments a, double low, double high, boolean whole) {
    if (low > high) {
      throw Fault.NUM.exception();
    }
    double u = a.surroundings().random();
    double first = whole ? Math.ceil(low) : low;
    double width = whole ? Math.floor(high) - first + 1 : high - low;
    return Coerce.of(whole ? first + Math.floor(u * width) : first + u * width);
  }

  private static Value array(Arguments a) {
    int rows = a.integer(0, 1);
    int columns = a.integer(1, 1);
    if (rows < 1 || columns < 1) {
      throw Fault.VALUE.exception();
    }
    Value[][] values = new Value[rows][columns];
    for (Value[] row : values) {
      for (int c = 0; c < columns; c++) {
        row[c] = between(a, a.number(2, 0), a.number(3, 1), a.logical(4, false));
      }
    }
    return new Value.Array(values);
  }
}
