package weighhouse.rules.check.evidence;

import java.util.Arrays;
import java.util.Locale;
import java.util.regex.Pattern;
import weighhouse.workbook.CellRange;

/**
 * A column of typed-in figures under its heading.
 *
 * @param range the cells of the figures
 * @param heading text at its head, in lower case
 * @param numbers the figures; of a column of words the place of each among the distinct ones
 * @param first the first of the distinct words in alphabetical order; empty for figures
 */
record DataColumn(CellRange range, String heading, NumberList numbers, String first) {

  /** Numbers that compare by content. */
  record NumberList(java.util.List<Double> values) {
    static NumberList of(double[] values) {
      return new NumberList(Arrays.stream(values).boxed().toList());
    }
  }

  double[] figures() {
    return numbers.values().stream().mapToDouble(Double::doubleValue).toArray();
  }

  int size() {
    return numbers.values().size();
  }

  boolean isHeaded(Pattern words) {
    return words.matcher(heading.toLowerCase(Locale.ROOT)).find();
  }

  boolean isAscending() {
    double[] figures = figures();
    for (int i = 1; i < figures.length; i++) {
      if (!(figures[i] > figures[i - 1])) {
        return false;
      }
    }
    return true;
  }

  /** Whether every figure is one of two. */
  boolean holdsOnly(double a, double b) {
    return numbers.values().stream().allMatch(figure -> figure == a || figure == b)
        && numbers.values().contains(a)
        && numbers.values().contains(b);
  }

  long distinct() {
    return numbers.values().stream().distinct().count();
  }
}
