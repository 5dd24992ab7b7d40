package weighhouse.recalculate.engine;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Queue;
import java.util.Set;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.function.Function;
import weighhouse.formula.Expr;
import weighhouse.recalculate.Change;
import weighhouse.recalculate.Recalculation;
import weighhouse.recalculate.Replay;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.Values;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.cells.Layout;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.order.Plan;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Compiler;
import weighhouse.recalculate.program.Footprint;
import weighhouse.recalculate.program.Frame;
import weighhouse.recalculate.program.Program;
import weighhouse.recalculate.program.Strip;
import weighhouse.recalculate.program.UnsupportedFormulaException;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Calculation of one compiled workbook. */
final class Engine implements Recalculation {
  /** Rounds after which computed references that still move are left as they are. */
  private static final int MOST_ROUNDS = 5;

  private final Model model;
  private final CellState base;
  private final Plans plans;
  private final Replay replay;
  private final CalculatedValues baseValues;
  private final Queue<Scratch> idle = new ConcurrentLinkedQueue<>();

  Engine(Model model) {
    this.model = model;
    BaseRun run = new BaseRun(model);
    this.base = run.values();
    this.plans = run.plans();
    this.replay = run.replay();
    this.baseValues =
        new CalculatedValues(model.layout(), base, new int[0], new CellState[0], Map.of());
  }

  @Override
  public Values base() {
    return baseValues;
  }

  @Override
  public Replay replay() {
    return replay;
  }

  @Override
  public Values whatIf(Change change) {
    return borrowing(scratch -> run(change, plans.with(difference(change)), Set.of(), scratch));
  }

  @Override
  public Values draw(long seed, Change change) {
    Plans.Planned planned = plans.with(difference(change));
    Set<Unit> kept = new HashSet<>(planned.kept());
    Set<Integer> drawing = new HashSet<>();
    List<Unit> units = planned.plan().units();
    for (int unit = 0; unit < units.size(); unit++) {
      if (units.get(unit).program().drawing()) {
        kept.remove(units.get(unit));
        drawing.add(unit);
      }
    }
    Plans.Planned drawn = planned.keeping(kept);
    return borrowing(
        scratch -> {
          scratch.runner().frame().seed = seed;
          return run(change, drawn, drawing, scratch);
        });
  }

  private <T> T borrowing(Function<Scratch, T> use) {
    Scratch scratch = idle.poll();
    if (scratch == null) {
      scratch = new Scratch(model.layout(), base, model.names());
    }
    T result = use.apply(scratch);
    scratch.reset();
    idle.add(scratch);
    return result;
  }

  private Plans.Difference difference(Change change) {
    Set<CellAddress> constants = new HashSet<>();
    for (CellAddress cell : change.values().keySet()) {
      plans.base().plan().unitsIn(CellRange.of(cell), unit -> constants.add(cell));
    }
    return new Plans.Difference(change.formulas(), constants);
  }

  /** Runs, and again in another order where a computed reference has moved. */
  private Values run(Change change, Plans.Planned planned, Set<Integer> drawing, Scratch scratch) {
    Plans.Planned present = planned;
    for (int round = 0; ; round++) {
      Map<CellAddress, Value> beside = once(change, present, drawing, scratch);
      Plan.Pointers now = scratch.runner().pointed().pointers(present.pointers());
      if (now.equals(present.pointers()) || round == MOST_ROUNDS) {
        return scratch.values(beside);
      }
      present = plans.repointed(present, now);
      scratch.reset();
    }
  }

  /** Runs what depends on the change; answers with the values of cells that have no slot. */
  private Map<CellAddress, Value> once(
      Change change, Plans.Planned planned, Set<Integer> drawing, Scratch scratch) {
    PartialRun run = new PartialRun(planned.plan(), planned.kept(), scratch);
    Map<CellAddress, Value> beside = new HashMap<>();
    for (Map.Entry<CellAddress, Value> entry : change.values().entrySet()) {
      int slot = slot(entry.getKey());
      if (slot == Layout.NOWHERE) {
        beside.put(entry.getKey(), entry.getValue());
      } else {
        scratch.set(slot, entry.getValue());
      }
      run.changed(CellRange.of(entry.getKey()));
    }
    List<Unit> units = planned.plan().units();
    planned.replaced().forEach(unit -> run.mark(unit, units.get(unit).hosts()));
    drawing.forEach(unit -> run.mark(unit, units.get(unit).hosts()));
    run.run();
    return beside;
  }

  private int slot(CellAddress cell) {
    return model.layout().slot(cell.sheet(), cell.row(), cell.column());
  }

  @Override
  public Value evaluate(Expr expression, CellAddress host, Values values) {
    try {
      boolean across = model.layout().across(host.sheet());
      return run(Compiler.compile(expression, host, false, across, model.names()), host, values);
    } catch (UnsupportedFormulaException e) {
      return Fault.NAME.value();
    }
  }

  private Value run(Program program, CellAddress host, Values values) {
    if (!(values instanceof CalculatedValues calculated)) {
      throw new IllegalArgumentException("values of another calculation");
    }
    return borrowing(
        scratch -> {
          calculated.putInto(scratch.state(), scratch.stretches());
          Frame frame = scratch.runner().frame();
          frame.enter(new Strip(program, CellRange.of(host), model.layout()));
          frame.moveTo(0);
          return program.root().result(frame);
        });
  }

  @Override
  public List<CellRange> dependents(Set<CellAddress> cells) {
    return new Dependents(plans.base().plan()).of(cells);
  }

  @Override
  public List<CellRange> precedents(CellAddress cell) {
    List<CellRange> read = new ArrayList<>();
    plans
        .base()
        .plan()
        .unitsIn(
            CellRange.of(cell),
            number -> {
              Unit unit = plans.base().plan().units().get(number);
              CellAddress host = unit.whole() ? unit.hosts().first() : cell;
              for (Footprint footprint : unit.reads()) {
                read.add(footprint.at(host.row(), host.column()));
              }
            });
    return read.stream().distinct().toList();
  }
}
