package weighhouse.rules.trial;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import weighhouse.formula.FormulaPrinter;
import weighhouse.quantity.Declarations;
import weighhouse.rules.Match;
import weighhouse.rules.RuleBook;
import weighhouse.rules.Subject;
import weighhouse.rules.file.Example;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** Runs examples of rules. */
public final class Trial {
  private static final double VALUE_WITHIN = 1e-9;

  private final RuleBook rules;
  private final BiFunction<Workbook, Declarations, Subject> reading;

  /**
   * @param reading from a workbook to what rules look at
   */
  public Trial(RuleBook rules, BiFunction<Workbook, Declarations, Subject> reading) {
    this.rules = rules;
    this.reading = reading;
  }

  /** What went otherwise than the example says, one sentence each; empty if all is well. */
  public List<String> run(String rule, Example example) {
    ExampleWorkbook small = ExampleWorkbook.of(example);
    Subject subject = reading.apply(small.workbook(), small.declarations());
    List<Match> all = rules.match(subject);
    List<Match> own =
        all.stream()
            .filter(match -> match.rule().id().equals(rule))
            .filter(match -> small.tested().contains(match.host()))
            .toList();
    return example.isFound() ? found(own, all, example, subject) : leftAlone(own, subject);
  }

  private static List<String> leftAlone(List<Match> own, Subject subject) {
    return own.stream().map(m -> "should be left alone, but: " + show(m, subject)).toList();
  }

  private static List<String> found(
      List<Match> own, List<Match> all, Example example, Subject subject) {
    if (own.size() != 1) {
      List<String> seen = all.stream().map(match -> show(match, subject)).toList();
      return List.of("one match expected, got " + own.size() + " of " + seen);
    }
    List<String> wrong = new ArrayList<>();
    Match match = own.get(0);
    String suggestion = suggestion(match);
    if (!example.finds().replace(" ", "").equals(suggestion.replace(" ", ""))) {
      wrong.add("suggests " + suggestion + " in place of " + example.finds());
    }
    if (!Double.isNaN(example.value())) {
      double value = value(match, subject);
      if (!(Math.abs(value - example.value()) <= VALUE_WITHIN)) {
        wrong.add("the corrected value is " + value + " in place of " + example.value());
      }
    }
    return wrong;
  }

  private static double value(Match match, Subject subject) {
    return match.suggestion() == null
        ? Double.NaN
        : subject
            .recalculation()
            .evaluate(match.suggestion(), match.host(), subject.recalculation().base())
            .number();
  }

  private static String suggestion(Match match) {
    CellAddress host = match.host();
    return match.suggestion() == null
        ? Example.SOMETHING
        : "=" + FormulaPrinter.print(match.suggestion(), host.row(), host.column());
  }

  private static String show(Match match, Subject subject) {
    return match.rule().id()
        + " at "
        + subject.workbook().show(match.host())
        + " suggesting "
        + suggestion(match);
  }
}
