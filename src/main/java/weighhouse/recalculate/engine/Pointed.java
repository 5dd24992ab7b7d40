package weighhouse.recalculate.engine;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import weighhouse.recalculate.order.Plan;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Frame;
import weighhouse.recalculate.program.Strip;
import weighhouse.workbook.CellRange;

/** Notes which rectangles cells read that point anywhere (OFFSET, INDIRECT, computed ranges). */
final class Pointed implements Frame.Watcher {
  private final Map<Unit, Map<Integer, List<CellRange>>> seen = new HashMap<>();
  private List<CellRange> current = new ArrayList<>();

  /** Starts a cell anew. */
  void start(Unit unit, Strip strip, int position) {
    current = new ArrayList<>();
    seen.computeIfAbsent(unit, u -> new HashMap<>()).put(number(unit, strip, position), current);
  }

  /** Number of a cell among the unit's cells, strip by strip. */
  private static int number(Unit unit, Strip strip, int position) {
    if (unit.whole()) {
      return 0;
    }
    CellRange hosts = unit.hosts();
    CellRange line = strip.hosts();
    int before = line.firstRow() - hosts.firstRow() + line.firstColumn() - hosts.firstColumn();
    return before * strip.length() + position;
  }

  @Override
  public void reads(int slot) {
    // single cells are among the program's footprints
  }

  @Override
  public void reads(CellRange area) {
    if (!current.contains(area)) {
      current.add(area);
    }
  }

  Plan.Pointers pointers(Plan.Pointers before) {
    Map<Unit, Map<Integer, List<CellRange>>> merged = new HashMap<>(before.byUnit());
    seen.forEach(
        (unit, cells) -> {
          Map<Integer, List<CellRange>> all =
              new HashMap<>(before.byUnit().getOrDefault(unit, Map.of()));
          all.putAll(cells);
          merged.put(unit, all);
        });
    return new Plan.Pointers(merged);
  }

  void clear() {
    seen.clear();
  }
}
