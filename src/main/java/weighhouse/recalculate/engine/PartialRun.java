package weighhouse.recalculate.engine;

import java.util.HashMap;
import java.util.Map;
import java.util.PriorityQueue;
import java.util.Set;
import weighhouse.recalculate.order.Plan;
import weighhouse.recalculate.order.Step;
import weighhouse.recalculate.order.Unit;
import weighhouse.workbook.CellRange;

/**
 * Runs what depends on a change, in order of the plan's steps; a cell whose value comes out as
 * before passes nothing on.
 */
final class PartialRun {
  /** A run that comes back to its steps more often than this will not settle. */
  private static final int MOST_STEPS = 20;

  private final Plan plan;
  private final Set<Unit> kept;
  private final Scratch scratch;
  private final Changes changes;
  private final Map<Integer, CellRange> dirty = new HashMap<>();
  private final PriorityQueue<Integer> due = new PriorityQueue<>();

  PartialRun(Plan plan, Set<Unit> kept, Scratch scratch) {
    this.plan = plan;
    this.kept = kept;
    this.scratch = scratch;
    this.changes = new Changes(scratch);
  }

  /** Marks all that reads a rectangle. */
  void changed(CellRange range) {
    plan.readersOf(range, this::mark);
  }

  /** Marks cells of a unit, by its position in the plan. */
  void mark(int unit, CellRange cells) {
    if (kept.contains(plan.units().get(unit))) {
      return;
    }
    CellRange before = dirty.get(unit);
    if (before == null) {
      due.add(plan.stepOf(unit));
    }
    dirty.put(unit, before == null ? cells : Changes.hull(before, cells));
  }

  /** Runs until nothing is left to run. */
  void run() {
    Map<Integer, Integer> visits = new HashMap<>();
    while (!due.isEmpty()) {
      int at = due.poll();
      if (visits.merge(at, 1, Integer::sum) <= MOST_STEPS) {
        run(plan.steps().get(at), at);
      }
    }
  }

  private void run(Step step, int at) {
    if (step instanceof Step.Sweep sweep) {
      CellRange cells = dirty.remove(plan.firstUnitOf(at));
      if (cells != null) {
        scratch.runner().sweep(sweep.unit(), cells, sweep.running());
        CellRange changed =
            changes.in(sweep.unit(), sweep.running() ? sweep.unit().hosts() : cells);
        if (changed != null) {
          plan.readersOf(changed, (unit, readers) -> markOthers(at, unit, readers));
        }
      }
      return;
    }
    boolean any = false;
    for (int unit : plan.unitsOf(at)) {
      any |= dirty.remove(unit) != null;
    }
    if (any) {
      weave((Step.Woven) step, at);
    }
  }

  private void weave(Step.Woven woven, int at) {
    scratch.runner().weave(woven, kept);
    for (Unit unit : woven.units()) {
      CellRange changed = changes.in(unit, unit.hosts());
      if (changed != null) {
        plan.readersOf(changed, (reader, cells) -> markOthers(at, reader, cells));
      }
    }
  }

  private void markOthers(int step, int unit, CellRange cells) {
    if (plan.stepOf(unit) != step) {
      mark(unit, cells);
    }
  }
}
