package weighhouse.recalculate.engine;

import java.util.BitSet;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import weighhouse.recalculate.Replay;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.order.Plan;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Frame;
import weighhouse.workbook.CellStore;

/** The workbook run as it is: first each formula on stored values, then all that is trusted. */
final class BaseRun {
  /** Rounds after which computed references that still move are left as they are. */
  private static final int MOST_ROUNDS = 8;

  private final Model model;
  private Plan.Pointers pointers = Plan.Pointers.NONE;
  private Plan plan;
  private Set<Unit> kept;
  private CellState values;
  private BitSet circular;
  private List<Replay.Difference> differences;

  BaseRun(Model model) {
    this.model = model;
    this.plan = plan();
    Set<Unit> drawing = drawing();
    replay(drawing);
    settle();
  }

  private Plan plan() {
    return new Plan(model.units(), model.workbook().sheets().size(), pointers);
  }

  /** Random draws and clocks with a stored value keep it. */
  private Set<Unit> drawing() {
    Set<Unit> drawing = new HashSet<>();
    for (Unit unit : model.units()) {
      int slot =
          model
              .layout()
              .slot(unit.hosts().sheet(), unit.hosts().firstRow(), unit.hosts().firstColumn());
      if (unit.program().drawing() && !model.stored().isBlank(slot)) {
        drawing.add(unit);
      }
    }
    return drawing;
  }

  private void replay(Set<Unit> drawing) {
    CellState state = model.stored().copy();
    ReplayRunner runner =
        new ReplayRunner(new Frame(model.layout(), state, model.names()), model.stored());
    circular = new FullRun(plan, drawing).run(runner);
    ReplayRun replay = new ReplayRun(model);
    replay.compare(runner.results(), circular, drawing);
    differences = replay.differences();
    kept = new HashSet<>(drawing);
    kept.addAll(replay.untrusted());
    repoint(runner);
  }

  /** Runs until computed references point where they did in the round before. */
  private void settle() {
    for (int round = 0; round < MOST_ROUNDS; round++) {
      values = model.stored().copy();
      Runner runner =
          new Runner(new Frame(model.layout(), values, model.names()), (from, to) -> true);
      circular = new FullRun(plan, kept).run(runner);
      if (!repoint(runner)) {
        return;
      }
    }
  }

  private boolean repoint(Runner runner) {
    Plan.Pointers now = runner.pointed().pointers(pointers);
    if (now.equals(pointers)) {
      return false;
    }
    pointers = now;
    plan = plan();
    return true;
  }

  Plans plans() {
    return new Plans(model, plan, kept, pointers);
  }

  CellState values() {
    return values;
  }

  Replay replay() {
    int run = 0;
    int drawn = 0;
    for (Unit unit : model.units()) {
      if (unit.program().drawing() && kept.contains(unit)) {
        drawn += (int) unit.hosts().size();
      } else {
        run += (int) unit.hosts().size();
      }
    }
    Map<String, Integer> unsupported = new TreeMap<>(model.refused());
    if (drawn > 0) {
      unsupported.put("random draw or clock", drawn);
    }
    int circles = circular.cardinality();
    if (circles > 0) {
      unsupported.put("circular reference", circles);
    }
    int recalculated = run - circles;
    return new Replay(
        formulaCells(), recalculated, recalculated - differences.size(), differences, unsupported);
  }

  private int formulaCells() {
    int count = 0;
    for (weighhouse.workbook.Sheet sheet : model.workbook().sheets()) {
      CellStore cells = sheet.cells();
      for (int i = 0; i < cells.size(); i++) {
        count += cells.hasFormula(i) ? 1 : 0;
      }
    }
    return count;
  }
}
