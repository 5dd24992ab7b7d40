package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Outcome;
import weighhouse.quantity.Role;
import weighhouse.quantity.label.Labels;
import weighhouse.quantity.vocabulary.Vocabulary;
import weighhouse.workbook.CellAddress;

/** Finds the model's results: cells of a result's kind that nothing but results is made from. */
final class Outcomes {
  private static final Set<Kind> RESULTS =
      EnumSet.of(Kind.COST, Kind.QALY, Kind.LIFE_YEARS, Kind.ICER, Kind.NET_BENEFIT);

  private static final int MOST = 40;

  private final Units units;
  private final Links links;
  private final Labels labels;
  private final Vocabulary vocabulary;

  Outcomes(Units units, Links links, Labels labels, Vocabulary vocabulary) {
    this.units = units;
    this.links = links;
    this.labels = labels;
    this.vocabulary = vocabulary;
  }

  List<Outcome> find() {
    List<Outcome> outcomes = new ArrayList<>();
    for (Unit unit : units.all()) {
      if (isResult(unit) && isEnd(unit)) {
        String label = labels.forPeople(unit.host());
        Kind kind = unit.kind();
        boolean incremental = kind == Kind.ICER || vocabulary.isIncremental(label);
        outcomes.add(new Outcome(unit.host(), kind, incremental, label));
      }
    }
    outcomes.sort(Comparator.comparingInt(Outcomes::rank));
    return List.copyOf(outcomes.subList(0, Math.min(MOST, outcomes.size())));
  }

  private static int rank(Outcome outcome) {
    int kind =
        switch (outcome.kind()) {
          case ICER -> 0;
          case NET_BENEFIT -> 1;
          case QALY -> 3;
          case LIFE_YEARS -> 4;
          default -> 5;
        };
    return outcome.incremental() ? kind : kind + 10;
  }

  private static boolean isResult(Unit unit) {
    return unit.isCalculated()
        && unit.range.size() == 1
        && RESULTS.contains(unit.kind())
        && unit.quantity().role() == Role.ESTIMATE;
  }

  /** Whether nothing is made from it but other results. */
  private boolean isEnd(Unit unit) {
    if (unit.kind() == Kind.ICER) {
      return true;
    }
    for (int id : links.dependents(unit)) {
      Unit other = units.get(id);
      boolean table = other.host().sheet() == unit.host().sheet();
      if (!isResult(other) && other.kind() != Kind.UNKNOWN && other.kind() != Kind.SWITCH) {
        return false;
      } else if (isResult(other) && !table && isCopy(other)) {
        return false;
      }
    }
    return true;
  }

  private static boolean isCopy(Unit unit) {
    return unit.tree instanceof Expr.CellRef || unit.tree instanceof Expr.NameRef;
  }

  /** The willingness to pay, a typed-in number. */
  Optional<CellAddress> threshold() {
    return units.all().stream()
        .filter(unit -> unit.kind() == Kind.THRESHOLD && unit.range.size() == 1)
        .min(Comparator.comparing(Unit::isCalculated))
        .map(Unit::host);
  }
}
