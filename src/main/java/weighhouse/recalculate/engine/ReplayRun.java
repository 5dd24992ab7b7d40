package weighhouse.recalculate.engine;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.recalculate.Replay;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.order.Unit;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Runs each formula on the stored values of what it reads, so that a cell is judged by its own
 * formula alone, and compares with its stored value. What has no stored value is calculated first.
 */
final class ReplayRun {
  private final Model model;
  private final CellState stored;
  private final Set<Unit> untrusted = new HashSet<>();
  private final Map<Integer, List<Replay.Difference>> differing = new LinkedHashMap<>();

  ReplayRun(Model model) {
    this.model = model;
    this.stored = model.stored();
  }

  /**
   * Compares a state in which every formula was run on stored values.
   *
   * @param calculated the results
   * @param circular slots of cells that read themselves
   */
  void compare(CellState calculated, java.util.BitSet circular, Set<Unit> kept) {
    for (Unit unit : model.units()) {
      if (!kept.contains(unit)) {
        compare(unit, calculated, circular);
      }
    }
    Set<Integer> failing = differing.keySet();
    for (Unit unit : model.units()) {
      if (failing.contains(unit.shape())) {
        untrusted.add(unit);
      }
    }
  }

  private void compare(Unit unit, CellState calculated, java.util.BitSet circular) {
    CellRange hosts = unit.hosts();
    for (int r = hosts.firstRow(); r <= hosts.lastRow(); r++) {
      for (int c = hosts.firstColumn(); c <= hosts.lastColumn(); c++) {
        int slot = model.layout().slot(hosts.sheet(), r, c);
        boolean compared = !stored.isBlank(slot) && !circular.get(slot);
        if (compared && !agree(slot, calculated)) {
          differing
              .computeIfAbsent(unit.shape(), s -> new ArrayList<>())
              .add(
                  new Replay.Difference(
                      new CellAddress(hosts.sheet(), r, c),
                      stored.get(slot),
                      calculated.get(slot)));
        }
      }
    }
  }

  private boolean agree(int slot, CellState calculated) {
    if (stored.isNumber(slot) && calculated.isNumber(slot)) {
      return Agreement.of(stored.numbers[slot], calculated.numbers[slot]);
    }
    Value a = stored.get(slot);
    Value b = calculated.get(slot);
    return a.equals(b);
  }

  Set<Unit> untrusted() {
    return untrusted;
  }

  /** First of each shape, then the others. */
  List<Replay.Difference> differences() {
    List<Replay.Difference> all = new ArrayList<>();
    differing.values().forEach(of -> all.add(of.get(0)));
    differing.values().forEach(of -> all.addAll(of.subList(1, of.size())));
    return all;
  }
}
