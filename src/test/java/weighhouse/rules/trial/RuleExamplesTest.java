package weighhouse.rules.trial;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.formula.ShapeIndex;
import weighhouse.formula.Shapes;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.inference.Inference;
import weighhouse.recalculate.Recalculation;
import weighhouse.recalculate.engine.Recalculations;
import weighhouse.rules.Check;
import weighhouse.rules.Rule;
import weighhouse.rules.RuleBook;
import weighhouse.rules.Subject;
import weighhouse.rules.file.Example;
import weighhouse.rules.file.RuleFile;
import weighhouse.workbook.Workbook;

/** Every example of every shipped rule file is a test. */
class RuleExamplesTest {
  /** Rules about labels, whose examples are read as any workbook is. */
  private static final Set<String> LABELS = Set.of("label-contradicts-use");

  private final RuleBook rules = RuleBook.shipped();

  @TestFactory
  Stream<DynamicTest> examples() {
    Trial plain = new Trial(rules, RuleExamplesTest::plain);
    Trial labelled = new Trial(rules, RuleExamplesTest::labelled);
    return rules.rules().stream()
        .map(Rule::id)
        .map(id -> rules.file(id).orElseThrow())
        .filter(file -> file.check() == null || !file.check().startsWith(Check.PROBE))
        .flatMap(
            file ->
                file.examples().stream()
                    .map(e -> test(LABELS.contains(file.rule()) ? labelled : plain, file, e)));
  }

  private static DynamicTest test(Trial trial, RuleFile file, Example example) {
    String name = file.rule() + ":" + example.line();
    return DynamicTest.dynamicTest(
        name, () -> assertEquals(List.of(), trial.run(file.rule(), example), file.path()));
  }

  private static Subject plain(Workbook workbook, Declarations declarations) {
    Shapes shapes = ShapeIndex.of(workbook);
    PlainQuantities quantities = new PlainQuantities(workbook, shapes, declarations);
    return new Subject(workbook, shapes, quantities, Recalculations.compile(workbook, shapes));
  }

  private static Subject labelled(Workbook workbook, Declarations declarations) {
    Shapes shapes = ShapeIndex.of(workbook);
    Recalculation recalculation = Recalculations.compile(workbook, shapes);
    Quantities quantities =
        Inference.infer(workbook, shapes, recalculation.base()::number, declarations);
    return new Subject(workbook, shapes, quantities, recalculation);
  }
}
