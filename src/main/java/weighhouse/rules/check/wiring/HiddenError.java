package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.recalculate.Value;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** An error that a formula swallows where an effect measure passes through it. */
public final class HiddenError implements Check {
  private static final Set<String> GUARDS = Set.of("IFERROR", "IFNA");
  private static final Set<String> QUESTIONS = Set.of("ISERROR", "ISERR", "ISNA");

  /** Cells of one region that are looked at. */
  private static final int SAMPLE = 200;

  @Override
  public String name() {
    return "hidden-error";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Match> matches = new ArrayList<>();
    for (Region region : survey.regions()) {
      CellAddress host = region.range().first();
      for (Expr node : Trees.walk(survey.tree(region))) {
        Expr guarded = guarded(node);
        if (guarded != null && carriesMeasure(guarded, node, host, survey)) {
          List<CellAddress> failing =
              Survey.spread(region.range(), SAMPLE).stream()
                  .filter(cell -> fails(guarded, cell, survey))
                  .toList();
          if (!failing.isEmpty()) {
            matches.add(match(rule, region.range(), node, failing, survey));
          }
        }
      }
    }
    return matches;
  }

  /** What may fail unseen inside the node; null where it guards nothing. */
  private static Expr guarded(Expr node) {
    if (!(node instanceof Expr.Call call) || call.arguments().isEmpty()) {
      return null;
    }
    boolean asks =
        call.function().equals("IF")
            && Trees.inside(call.arguments().get(0)) instanceof Expr.Call question
            && QUESTIONS.contains(question.function());
    if (asks) {
      return Trees.children(Trees.inside(call.arguments().get(0))).get(0);
    }
    return GUARDS.contains(call.function()) ? call.arguments().get(0) : null;
  }

  private static boolean carriesMeasure(Expr guarded, Expr node, CellAddress host, Survey survey) {
    return Measures.isMeasure(survey.kind(node, host))
        || !survey.measuresIn(guarded, host).isEmpty();
  }

  private static boolean fails(Expr guarded, CellAddress cell, Survey survey) {
    Value value = survey.subject().recalculation().evaluate(guarded, cell, survey.base());
    return value instanceof Value.Fault fault && !fault.code().equals("#NAME?");
  }

  private static Match match(
      Rule rule, CellRange range, Expr node, List<CellAddress> failing, Survey survey) {
    String first = survey.subject().workbook().show(failing.get(0));
    return Survey.match(rule, range, node, null, "An error is hidden first in " + first + ".");
  }
}
