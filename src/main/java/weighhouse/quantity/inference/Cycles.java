package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import weighhouse.quantity.Cycle;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;
import weighhouse.quantity.label.Label;
import weighhouse.quantity.vocabulary.Vocabulary;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** Finds the model's cycle length: declared, in a cell, in words, or in the column of times. */
final class Cycles {
  private final Workbook workbook;
  private final Units units;
  private final Vocabulary vocabulary;
  private final ToDoubleFunction<CellAddress> numbers;
  private final Declarations declarations;

  Cycles(
      Workbook workbook,
      Units units,
      Vocabulary vocabulary,
      ToDoubleFunction<CellAddress> numbers,
      Declarations declarations) {
    this.workbook = workbook;
    this.units = units;
    this.vocabulary = vocabulary;
    this.numbers = numbers;
    this.declarations = declarations;
  }

  private record Found(CellAddress cell, double years, String evidence, int rank) {}

  Cycle find() {
    List<Found> found = new ArrayList<>();
    units.all().stream().filter(u -> u.range.size() == 1).forEach(u -> input(u, found));
    List<CellAddress> inputs = found.stream().map(Found::cell).toList();
    if (!Double.isNaN(declarations.cycleYears())) {
      return new Cycle(declarations.cycleYears(), inputs, List.of("declared"));
    }
    Optional<Found> best = found.stream().min(Comparator.comparingInt(Found::rank));
    if (best.isPresent()) {
      List<String> evidence = found.stream().map(Found::evidence).toList();
      return new Cycle(best.get().years(), inputs, evidence);
    }
    CycleWords words = new CycleWords(workbook, vocabulary);
    return words.find().orElseGet(() -> new CycleTimes(workbook, units, numbers).find());
  }

  private void input(Unit unit, List<Found> found) {
    if (unit.quantity().role() != Role.ESTIMATE) {
      return;
    }
    double number = numbers.applyAsDouble(unit.host());
    double years =
        switch (unit.kind()) {
          case CYCLE_LENGTH -> length(number, unit.quantity().span());
          case CYCLES_PER_YEAR -> number > 0 ? 1 / number : Double.NaN;
          default -> Double.NaN;
        };
    if (!Double.isNaN(years)) {
      found.add(new Found(unit.host(), years, evidence(unit, number), rank(unit)));
    }
  }

  /** Typed-in numbers with a unit come first, then what is calculated from them. */
  private static int rank(Unit unit) {
    boolean unitTold = unit.quantity().span() != null || unit.kind() == Kind.CYCLES_PER_YEAR;
    return (unit.isCalculated() ? 1 : 0) + (unitTold ? 0 : 2);
  }

  private String evidence(Unit unit, double number) {
    String text =
        unit.guess.labels().stream().findFirst().map(Label::text).orElse(unit.kind().text());
    return text.strip() + " = " + number + " in " + workbook.show(unit.host());
  }

  /** The length in years; a number without a unit is read as years where it can be. */
  private static double length(double number, Span unit) {
    if (!(number > 0)) {
      return Double.NaN;
    } else if (unit != null && unit.unit() != TimeUnit.CYCLE) {
      return number * unit.unit().years();
    }
    return number <= 1 ? number : unitless(number);
  }

  /** Larger numbers without a unit: days of a week, of four weeks, of a month. */
  private static double unitless(double number) {
    return number >= 7 && number <= 366 && number != 12
        ? number * TimeUnit.DAY.years()
        : Double.NaN;
  }
}
