package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.recalculate.Values;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Rows of transition probabilities that do not sum to 1, and cohorts that grow or shrink. */
public final class RowSum implements Check {
  private static final double EXACT = 1e-7;

  /** What three printed digits of each probability may leave. */
  private static final double PRINTED = 0.0005;

  @Override
  public String name() {
    return "row-sum";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Match> matches = new ArrayList<>();
    Values neutral = Neutral.values(survey);
    for (CellRange row : Matrices.rows(survey)) {
      double off = Math.abs(Matrices.sum(row, survey.base()) - 1);
      double without = Math.abs(Matrices.sum(row, neutral) - 1);
      if (isStored(row, survey) && off > EXACT && !(without <= EXACT)) {
        boolean printed = off <= PRINTED * row.columns() && isTyped(row, survey);
        String note = "The row sums to " + Matrices.sum(row, survey.base()) + ".";
        matches.add(Survey.match(printed ? rule.at("query") : rule, row, null, null, note));
      }
    }
    leaks(survey, neutral, rule, matches);
    return matches;
  }

  /** A cohort that leaks is one where another cohort of as many states is kept. */
  private static void leaks(Survey survey, Values neutral, Rule rule, List<Match> matches) {
    List<Traces.Trace> traces = Traces.of(survey);
    for (Traces.Trace trace : traces) {
      double leak = trace.leak(survey.base());
      boolean comparable =
          traces.stream()
              .filter(other -> other.states().size() == trace.states().size())
              .anyMatch(other -> other.leak(survey.base()) <= EXACT);
      if (comparable && leak > EXACT && !(trace.leak(neutral) <= EXACT)) {
        String note = "The cohort changes by up to " + 100 * leak + " % of its start.";
        CellRange first = trace.states().get(0).cells();
        matches.add(Survey.match(rule, first, null, null, note));
      }
    }
  }

  private static boolean isStored(CellRange row, Survey survey) {
    return Survey.cells(row).stream().anyMatch(cell -> survey.base().number(cell) != 0);
  }

  private static boolean isTyped(CellRange row, Survey survey) {
    List<CellAddress> cells = Survey.cells(row);
    return cells.stream().noneMatch(survey::hasFormula);
  }
}
