package weighhouse.recalculate.engine;

import java.util.BitSet;
import java.util.Set;
import weighhouse.recalculate.order.Plan;
import weighhouse.recalculate.order.Step;
import weighhouse.recalculate.order.Unit;

/** All units of a plan in order, but for those that keep their values. */
final class FullRun {
  private final Plan plan;
  private final Set<Unit> kept;

  FullRun(Plan plan, Set<Unit> kept) {
    this.plan = plan;
    this.kept = kept;
  }

  /** Runs; answers with the slots of circular cells. */
  BitSet run(Runner runner) {
    BitSet circular = new BitSet();
    for (Step step : plan.steps()) {
      if (step instanceof Step.Sweep sweep) {
        if (!kept.contains(sweep.unit())) {
          runner.sweep(sweep.unit(), sweep.unit().hosts(), sweep.running());
        }
      } else {
        circular.or(runner.weave((Step.Woven) step, kept));
      }
    }
    return circular;
  }
}
