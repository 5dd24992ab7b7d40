package weighhouse.recalculate.functions;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.stat.StatUtils;
import weighhouse.recalculate.Value;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Sheet;

/** SUBTOTAL and AGGREGATE: a statistic by number, without hidden rows or errors if asked. */
final class Subtotals {
  /** From this number on SUBTOTAL leaves out hidden rows. */
  private static final int VISIBLE_ONLY = 100;

  private Subtotals() {}

  static void enter(Entries entries) {
    entries.general("SUBTOTAL", "VR+", Subtotals::subtotal);
    entries.general("AGGREGATE", "VVAa+", Subtotals::aggregate);
  }

  private static Value subtotal(Arguments a) {
    int number = a.integer(0);
    boolean visible = number > VISIBLE_ONLY;
    List<Value> values = values(a, 1, a.count(), visible, true, false);
    return statistic(visible ? number - VISIBLE_ONLY : number, values, Double.NaN);
  }

  /** Options: 1, 3, 5, 7 leave out hidden rows; 2, 3, 6, 7 errors; 0 to 3 other subtotals. */
  private static Value aggregate(Arguments a) {
    int number = a.integer(0);
    int options = a.integer(1, 0);
    boolean ranked = number >= 14;
    boolean visible = options % 2 == 1;
    boolean skipErrors = options % 4 >= 2;
    int end = ranked ? 3 : a.count();
    List<Value> values = values(a, 2, end, visible, options < 4, skipErrors);
    return statistic(number, values, ranked ? a.number(3) : Double.NaN);
  }

  private static List<Value> values(
      Arguments a, int from, int to, boolean visible, boolean skipNested, boolean skipErrors) {
    List<Value> values = new ArrayList<>();
    for (int i = from; i < to; i++) {
      Grid grid = a.grid(i);
      Reference reference = a.reference(i);
      for (int r = 0; r < grid.usedRows(); r++) {
        for (int c = 0; c < grid.usedColumns(); c++) {
          Value value = grid.at(r, c);
          boolean left = value instanceof Value.Fault && skipErrors;
          if (!left && !leftOut(a, reference, r, c, visible, skipNested)) {
            values.add(Coerce.sound(value));
          }
        }
      }
    }
    return values;
  }

  private static boolean leftOut(
      Arguments a, Reference reference, int row, int column, boolean visible, boolean nested) {
    if (reference == null || reference.areas().size() > 1) {
      return false;
    }
    CellRange area = reference.area();
    Sheet sheet = a.surroundings().workbook().sheet(area.sheet());
    if (visible && sheet.hiddenRows().get(area.firstRow() + row)) {
      return true;
    }
    int index = sheet.cells().find(area.firstRow() + row, area.firstColumn() + column);
    String formula = nested && index >= 0 ? sheet.cells().formula(index) : null;
    return formula != null
        && (formula.regionMatches(true, 0, "SUBTOTAL(", 0, 9)
            || formula.toUpperCase(java.util.Locale.ROOT).contains("AGGREGATE("));
  }

  private static Value statistic(int number, List<Value> values, double k) {
    double[] numbers =
        values.stream().filter(v -> v instanceof Value.Num).mapToDouble(Value::number).toArray();
    return switch (number) {
      case 1 -> SumFunctions.mean(numbers);
      case 2 -> Coerce.of(numbers.length);
      case 3 -> Coerce.of(values.stream().filter(v -> !(v instanceof Value.Blank)).count() + 0.0);
      case 4 -> Coerce.of(Arrays.stream(numbers).max().orElse(0));
      case 5 -> Coerce.of(Arrays.stream(numbers).min().orElse(0));
      case 6 -> Coerce.of(numbers.length == 0 ? 0 : StatUtils.product(numbers));
      case 7 -> spread(numbers, 2, Math.sqrt(StatUtils.variance(numbers)));
      case 8 -> spread(numbers, 1, Math.sqrt(StatUtils.populationVariance(numbers)));
      case 9 -> Coerce.of(StatUtils.sum(numbers));
      case 10 -> spread(numbers, 2, StatUtils.variance(numbers));
      case 11 -> spread(numbers, 1, StatUtils.populationVariance(numbers));
      default -> ordered(number, numbers, k);
    };
  }

  private static Value spread(double[] numbers, int least, double spread) {
    return numbers.length < least ? Fault.DIV0.value() : Coerce.of(spread);
  }

  private static Value ordered(int number, double[] numbers, double k) {
    Arrays.sort(numbers);
    if (numbers.length == 0) {
      throw Fault.NUM.exception();
    }
    return switch (number) {
      case 12 -> Coerce.of(StatisticsFunctions.median(numbers));
      case 14, 15 -> {
        int at = (int) Math.ceil(k);
        if (at < 1 || at > numbers.length) {
          throw Fault.NUM.exception();
        }
        yield Coerce.of(numbers[number == 14 ? numbers.length - at : at - 1]);
      }
      case 16 -> Ranks.inclusive(numbers, k);
      case 17 -> Ranks.inclusive(numbers, Math.floor(k) / 4);
      case 18 -> Ranks.exclusive(numbers, k);
      case 19 -> Ranks.exclusive(numbers, Math.floor(k) / 4);
      default -> throw Fault.VALUE.exception();
    };
  }
}
