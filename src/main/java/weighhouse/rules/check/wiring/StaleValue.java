package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.Trees;
import weighhouse.recalculate.Replay;
import weighhouse.recalculate.Value;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** A stored value that its own formula does not give, on the way from an effect measure. */
public final class StaleValue implements Check {
  /** Functions about which no two spreadsheets differ: a difference is the file's, not ours. */
  private static final Set<String> PLAIN =
      Set.of(
          "EXP", "LN", "LOG10", "SQRT", "POWER", "PRODUCT", "SUM", "MIN", "MAX", "ABS", "IF",
          "ROUND", "AND", "OR", "NOT", "AVERAGE");

  @Override
  public String name() {
    return "stale-value";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<CellRange> reached = subject.recalculation().dependents(new TreeSet<>(survey.measures()));
    Map<Integer, List<Replay.Difference>> byRegion = new LinkedHashMap<>();
    for (Replay.Difference difference : subject.recalculation().replay().differing()) {
      CellAddress cell = difference.cell();
      Region region = subject.shapes().regionAt(cell);
      boolean judged = region != null && isPlain(survey.shape(region)) && isNumber(difference);
      if (judged && reached.stream().anyMatch(range -> range.contains(cell))) {
        byRegion.computeIfAbsent(region.id(), id -> new ArrayList<>()).add(difference);
      }
    }
    return byRegion.values().stream().map(stale -> match(rule, stale, survey)).toList();
  }

  private static boolean isPlain(Shape shape) {
    return !shape.array() && Trees.walk(shape.tree()).stream().allMatch(StaleValue::isPlain);
  }

  private static boolean isPlain(Expr node) {
    return node instanceof Expr.Call call
        ? PLAIN.contains(call.function())
        : !(node instanceof Expr.TableRef || node instanceof Expr.SpillRef);
  }

  private static boolean isNumber(Replay.Difference difference) {
    return difference.stored() instanceof Value.Num
        && difference.recalculated() instanceof Value.Num;
  }

  private static Match match(Rule rule, List<Replay.Difference> stale, Survey survey) {
    Replay.Difference first = stale.get(0);
    String note =
        "%s is stored as %s, its formula gives %s."
            .formatted(
                survey.subject().workbook().show(first.cell()),
                first.stored().number(),
                first.recalculated().number());
    List<CellRange> cells = stale.stream().map(d -> CellRange.of(d.cell())).toList();
    return new Match(rule, cells, first.cell(), null, null, Map.of(), List.of(note));
  }
}
