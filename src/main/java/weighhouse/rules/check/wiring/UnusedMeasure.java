package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Shape;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.recalculate.Change;
import weighhouse.recalculate.Replay;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.Values;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** An effect measure that moves no number of the model, whatever its switches say. */
public final class UnusedMeasure implements Check {
  private static final double OTHER_VALUE = 1.3;
  private static final List<Double> SETTINGS = List.of(0.0, 1.0, 2.0, 3.0);
  private static final int MOST_SWITCHES = 12;
  private static final int SAMPLE = 5;

  /** How many rows up and down other inputs of the same list are looked for. */
  private static final int NEIGHBOURHOOD = 6;

  @Override
  public String name() {
    return "unused-measure";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    if (!subject.quantities().healthEconomic() || computesReferences(subject)) {
      return List.of();
    }
    Model model = new Model(survey);
    List<CellAddress> measures = survey.measures();
    List<CellAddress> unused =
        measures.stream()
            .filter(cell -> Measures.isRatio(survey.kind(cell)))
            .filter(cell -> !model.moves(cell))
            .toList();
    List<Match> matches = new ArrayList<>();
    for (CellAddress cell : unused) {
      if (isMeantForUse(cell, measures, unused, survey)) {
        matches.add(Survey.match(rule, CellRange.of(cell), null, null));
      }
    }
    return matches;
  }

  /** Which cells INDIRECT reads shows only when it runs. */
  private static boolean computesReferences(Subject subject) {
    return subject.shapes().all().stream().anyMatch(UnusedMeasure::isIndirect);
  }

  private static boolean isIndirect(Shape shape) {
    return Trees.contains(
        shape.tree(), node -> node instanceof Expr.Call call && call.function().equals("INDIRECT"));
  }

  /** Evidence that is only listed, and copies of a measure in use, are not meant for use. */
  private static boolean isMeantForUse(
      CellAddress cell, List<CellAddress> measures, List<CellAddress> unused, Survey survey) {
    double value = survey.base().number(cell);
    boolean copy =
        measures.stream()
            .filter(other -> !unused.contains(other))
            .anyMatch(other -> Math.abs(survey.base().number(other) - value) < 1e-9);
    return !copy
        && !isVariant(cell, measures, unused)
        && (measures.size() == 1 || isAmongInputs(cell, survey));
  }

  /** A limit, a fixed value or another scenario beside a measure in use. */
  private static boolean isVariant(
      CellAddress cell, List<CellAddress> measures, List<CellAddress> unused) {
    return measures.stream()
        .filter(other -> other.sheet() == cell.sheet() && other.row() == cell.row())
        .anyMatch(other -> !unused.contains(other));
  }

  private static boolean isAmongInputs(CellAddress cell, Survey survey) {
    for (int step = 1; step <= NEIGHBOURHOOD; step++) {
      for (CellAddress near : List.of(cell.offset(-step, 0), cell.offset(step, 0))) {
        if (near.row() >= 0 && survey.isTyped(near) && survey.isRead(near)) {
          return true;
        }
      }
    }
    return false;
  }

  /** The model run with one measure at another value, under each setting of each switch. */
  private static final class Model {
    private final Survey survey;
    private final List<CellAddress> switches;

    /** What could not be run keeps its value whatever the measure is. */
    private final boolean everythingRan;

    Model(Survey survey) {
      this.survey = survey;
      Replay replay = survey.subject().recalculation().replay();
      this.everythingRan = replay.unsupported().isEmpty() && replay.differing().isEmpty();
      this.switches =
          survey.subject().quantities().ranges().stream()
              .filter(range -> survey.kind(range.first()) == Kind.SWITCH)
              .flatMap(range -> Survey.spread(range, SAMPLE).stream())
              .filter(survey::isTyped)
              .limit(MOST_SWITCHES)
              .toList();
    }

    boolean moves(CellAddress measure) {
      List<CellAddress> dependents =
          survey.subject().recalculation().dependents(Set.of(measure)).stream()
              .flatMap(range -> Survey.spread(range, SAMPLE).stream())
              .filter(cell -> !Measures.isMeasure(survey.kind(cell)))
              .toList();
      if (dependents.isEmpty()) {
        return false;
      }
      return !everythingRan
          || moves(measure, Map.of(), dependents)
          || switches.stream().anyMatch(cell -> movesUnder(measure, cell, dependents));
    }

    private boolean movesUnder(
        CellAddress measure, CellAddress setting, List<CellAddress> dependents) {
      return SETTINGS.stream()
          .anyMatch(value -> moves(measure, Map.of(setting, new Value.Num(value)), dependents));
    }

    private boolean moves(
        CellAddress measure, Map<CellAddress, Value> held, List<CellAddress> dependents) {
      Values before = survey.subject().recalculation().whatIf(new Change(held, Map.of()));
      Map<CellAddress, Value> changed = new HashMap<>(held);
      double value = survey.base().number(measure);
      changed.put(measure, new Value.Num(value == 0 ? 1 : value * OTHER_VALUE));
      Values after = survey.subject().recalculation().whatIf(new Change(changed, Map.of()));
      return dependents.stream().anyMatch(cell -> !before.at(cell).equals(after.at(cell)));
    }
  }
}
