package weighhouse.audit.probe;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.Region;
import weighhouse.quantity.Kind;
import weighhouse.recalculate.Value;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Tries a model's switches (scenario, probabilistic mode) under their other settings. */
final class SwitchSearch {
  /** Settings that switches have in practice; the one that holds now is left out. */
  private static final List<Double> SETTINGS = List.of(0.0, 1.0, 2.0, 3.0);

  private static final int MOST_SWITCHES = 12;

  private final Subject subject;

  SwitchSearch(Subject subject) {
    this.subject = subject;
  }

  /** Runs of the measure under the first setting of any one switch in which it moves a risk. */
  Optional<Probe.Runs> runsThatMove(Ledger.Entry entry, List<Region> risks) {
    if (risks.isEmpty()) {
      return Optional.empty();
    }
    for (CellAddress cell : switches()) {
      double now = subject.recalculation().base().number(cell);
      for (double setting : SETTINGS) {
        if (setting == now) {
          continue;
        }
        Probe.Runs runs = new Probe(subject, Map.of(cell, new Value.Num(setting))).run(entry);
        boolean moves =
            risks.stream()
                .flatMap(region -> CellsOf.spread(region.range(), Reach.SAMPLE).stream())
                .anyMatch(runs::moves);
        if (moves) {
          return Optional.of(runs);
        }
      }
    }
    return Optional.empty();
  }

  private List<CellAddress> switches() {
    List<CellAddress> cells = new ArrayList<>();
    for (CellRange range : subject.quantities().ranges()) {
      if (cells.size() < MOST_SWITCHES
          && subject.quantities().at(range.first()).kind() == Kind.SWITCH) {
        CellsOf.stored(subject.workbook(), range).stream()
            .filter(cell -> subject.shapes().at(cell) == null)
            .limit(MOST_SWITCHES)
            .forEach(cells::add);
      }
    }
    return cells;
  }
}
