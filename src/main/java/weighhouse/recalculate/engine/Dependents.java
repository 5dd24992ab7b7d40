package weighhouse.recalculate.engine;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.PriorityQueue;
import java.util.TreeMap;
import weighhouse.recalculate.order.Plan;
import weighhouse.recalculate.order.Step;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Follows a plan from cells to all that reads them, without running anything. */
final class Dependents {
  private final Plan plan;
  private final TreeMap<Integer, CellRange> reached = new TreeMap<>();
  private final PriorityQueue<Integer> due = new PriorityQueue<>();

  Dependents(Plan plan) {
    this.plan = plan;
  }

  List<CellRange> of(Collection<CellAddress> cells) {
    cells.forEach(cell -> plan.readersOf(CellRange.of(cell), this::reach));
    while (!due.isEmpty()) {
      int step = due.poll();
      boolean woven = plan.steps().get(step) instanceof Step.Woven;
      for (int unit : plan.unitsOf(step)) {
        if (woven) {
          reached.put(unit, plan.units().get(unit).hosts());
        }
        plan.readersOf(reached.get(unit), this::reach);
      }
    }
    return new ArrayList<>(reached.values());
  }

  private void reach(int unit, CellRange cells) {
    CellRange before = reached.get(unit);
    CellRange now = before == null ? cells : Changes.hull(before, cells);
    boolean running =
        plan.steps().get(plan.stepOf(unit)) instanceof Step.Sweep sweep && sweep.running();
    if (running) {
      now = Changes.hull(now, plan.units().get(unit).hosts());
    }
    if (!now.equals(before)) {
      reached.put(unit, now);
      due.add(plan.stepOf(unit));
    }
  }
}
