package weighhouse.quantity.inference;

import java.util.List;
import java.util.function.ToDoubleFunction;
import weighhouse.quantity.Cycle;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** The cycle length as the step of a line of times beside a trace: 0, 1/12, 2/12 years. */
final class CycleTimes {
  private static final int SHORTEST = 3;
  private static final double ROUNDING = 1e-6;

  private final Workbook workbook;
  private final Units units;
  private final ToDoubleFunction<CellAddress> numbers;

  CycleTimes(Workbook workbook, Units units, ToDoubleFunction<CellAddress> numbers) {
    this.workbook = workbook;
    this.units = units;
    this.numbers = numbers;
  }

  Cycle find() {
    for (Unit unit : units.all()) {
      Span timeUnit = unit.quantity().span();
      boolean told =
          unit.kind() == Kind.TIME && timeUnit != null && timeUnit.unit() != TimeUnit.CYCLE;
      boolean line = unit.range.size() >= SHORTEST;
      if (told && line && isByTrace(unit)) {
        double step = step(unit) * timeUnit.unit().years();
        if (step > 0) {
          String evidence = "steps of the times in " + workbook.show(unit.range);
          return new Cycle(step, List.of(), List.of(evidence));
        }
      }
    }
    return new Cycle(Double.NaN, List.of(), List.of());
  }

  private boolean isByTrace(Unit unit) {
    return units.all().stream()
        .anyMatch(
            u ->
                u.kind() == Kind.OCCUPANCY
                    && u.range.sheet() == unit.range.sheet()
                    && (u.range.lastRow() == unit.range.lastRow()
                        || u.range.lastColumn() == unit.range.lastColumn()));
  }

  /** The step from cell to cell, if it is the same at both ends; else 0. */
  private double step(Unit unit) {
    Lines lines = new Lines(unit.range.columns() == 1);
    int length = lines.length(unit.range);
    double first = difference(unit, lines, 0);
    double last = difference(unit, lines, length - 2);
    return Math.abs(first - last) < ROUNDING ? first : 0;
  }

  private double difference(Unit unit, Lines lines, int at) {
    CellAddress from = lines.later(unit.host(), at);
    return numbers.applyAsDouble(lines.later(from, 1)) - numbers.applyAsDouble(from);
  }
}
