package weighhouse.quantity.inference;

import java.util.function.ToDoubleFunction;
import weighhouse.formula.Shapes;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.algebra.Algebra;
import weighhouse.quantity.label.Guess;
import weighhouse.quantity.label.Headings;
import weighhouse.quantity.label.Labels;
import weighhouse.quantity.vocabulary.Vocabulary;
import weighhouse.quantity.vocabulary.VocabularyReader;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** What every number of a workbook means. */
public final class Inference {
  private final Workbook workbook;
  private final Vocabulary vocabulary;
  private final Declarations declarations;
  private final ToDoubleFunction<CellAddress> numbers;
  private final Labels labels;
  private final Units units;
  private final UnitOperands operands;
  private final Algebra algebra;

  private Inference(
      Workbook workbook,
      Shapes shapes,
      ToDoubleFunction<CellAddress> numbers,
      Declarations declarations,
      Vocabulary vocabulary) {
    this.workbook = workbook;
    this.vocabulary = vocabulary;
    this.declarations = declarations;
    this.numbers = numbers;
    Headings headings = new Headings(workbook, vocabulary);
    this.labels = new Labels(headings);
    this.units = UnitFinder.find(workbook, shapes, headings, declarations);
    this.operands = new UnitOperands(workbook, units, vocabulary, numbers);
    this.algebra = new Algebra(operands);
  }

  /**
   * Infers the quantities of a workbook with the program's own vocabulary.
   *
   * @param numbers the number in a cell, stored or recalculated; NaN where there is none
   * @param declarations what the reviewer declares, stronger than anything inferred
   */
  public static Quantities infer(
      Workbook workbook,
      Shapes shapes,
      ToDoubleFunction<CellAddress> numbers,
      Declarations declarations) {
    return infer(workbook, shapes, numbers, declarations, VocabularyReader.shipped());
  }

  /** The same with a vocabulary that a house extended. */
  public static Quantities infer(
      Workbook workbook,
      Shapes shapes,
      ToDoubleFunction<CellAddress> numbers,
      Declarations declarations,
      Vocabulary vocabulary) {
    return new Inference(workbook, shapes, numbers, declarations, vocabulary).run();
  }

  private Quantities run() {
    declare();
    Field field = Field.of(workbook, vocabulary);
    boolean model = field.isHealthEconomic() || !declarations.quantities().isEmpty();
    Links links = new Links(units, operands);
    if (model) {
      units.all().forEach(unit -> unit.guess = guess(unit));
      new Limits(units).assign();
      new Traces(units, numbers).mark();
      new Matrices(workbook, units, numbers).mark();
    }
    Fixpoint fixpoint = new Fixpoint(units, links, algebra);
    if (model) {
      fixpoint.run();
      new Splitter(units, links, algebra, operands).split(fixpoint, this::guess);
    } else {
      units.all().forEach(unit -> unit.verdict = Judge.of(unit));
    }
    Cycles cycles = new Cycles(workbook, units, vocabulary, numbers, declarations);
    Outcomes outcomes = new Outcomes(units, links, labels, vocabulary);
    return new InferredQuantities(workbook, units, algebra, labels, cycles.find(), outcomes, model);
  }

  private void declare() {
    declarations
        .quantities()
        .forEach(
            (range, quantity) ->
                units.in(range, Integer.MAX_VALUE).stream()
                    .filter(unit -> range.contains(unit.range.first()))
                    .forEach(unit -> unit.declared = quantity));
  }

  private Guess guess(Unit unit) {
    double number = unit.isCalculated() ? Double.NaN : numbers.applyAsDouble(unit.host());
    return labels.guess(unit.host(), number);
  }
}
