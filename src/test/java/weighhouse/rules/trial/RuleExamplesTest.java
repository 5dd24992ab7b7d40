package weighhouse.rules.trial;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.formula.ShapeIndex;
import weighhouse.formula.Shapes;
import weighhouse.quantity.Declarations;
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
  private final RuleBook rules = RuleBook.shipped();

  @TestFactory
  Stream<DynamicTest> examples() {
    Trial trial = new Trial(rules, RuleExamplesTest::plain);
    return rules.rules().stream()
        .map(Rule::id)
        .map(id -> rules.file(id).orElseThrow())
        .filter(file -> file.check() == null || !file.check().startsWith(Check.PROBE))
        .flatMap(file -> file.examples().stream().map(example -> test(trial, file, example)));
  }

  private static DynamicTest test(Trial trial, RuleFile file, Example example) {
    String name = file.rule() + ":" + example.line();
    return DynamicTest.dynamicTest(
        name, () -> assertEquals(List.of(), trial.run(file.rule(), example), file.path()));
  }

  private static Subject plain(Workbook workbook, Declarations declarations) {
    Shapes shapes = ShapeIndex.of(workbook);
    PlainQuantities quantities = new PlainQuantities(workbook, shapes, declarations);
    return new Subject(
        workbook, shapes, quantities, Recalculations.compile(workbook, shapes));
  }
}
