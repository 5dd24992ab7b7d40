package weighhouse.recalculate.engine;

import java.util.ArrayDeque;
import java.util.BitSet;
import java.util.Deque;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import weighhouse.recalculate.cells.Layout;
import weighhouse.recalculate.order.Step;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Frame;
import weighhouse.recalculate.program.Strip;
import weighhouse.workbook.CellRange;

/**
 * Runs a weave whose cells may read themselves through others. A cell that finds what it reads not
 * yet calculated gives way to it; one that waits for itself is circular and keeps what is stored.
 * Branches that are not taken read nothing, so they close no circle.
 */
final class Circles implements Frame.Watcher {
  /** Thrown out of an evaluation that reads a cell not yet calculated. */
  private static final class Waiting extends RuntimeException {
    private static final long serialVersionUID = 1L;
    private final int slot;

    Waiting(int slot) {
      super(null, null, false, false);
      this.slot = slot;
    }
  }

  private final Step.Woven woven;
  private final Runner runner;
  private final Layout layout;

  /** Cell of the weave by slot. */
  private final Map<Integer, Integer> cellOf = new HashMap<>();

  private final BitSet done = new BitSet();
  private final BitSet circular = new BitSet();
  private final Deque<Integer> waiting = new ArrayDeque<>();
  private final BitSet waitingCells = new BitSet();

  Circles(Step.Woven woven, Runner runner, Set<Unit> kept) {
    this.woven = woven;
    this.runner = runner;
    this.layout = runner.frame().layout();
    for (int cell = 0; cell < woven.stripOf().length; cell++) {
      for (int slot : slots(cell)) {
        cellOf.put(slot, cell);
      }
      done.set(cell, kept.contains(woven.unitOfStrip().get(woven.stripOf()[cell])));
    }
  }

  private int[] slots(int cell) {
    Unit unit = woven.unitOfStrip().get(woven.stripOf()[cell]);
    Strip strip = woven.strips().get(woven.stripOf()[cell]);
    if (!unit.whole()) {
      return new int[] {strip.slot() + woven.positions()[cell]};
    }
    java.util.stream.IntStream.Builder slots = java.util.stream.IntStream.builder();
    layout.runs(
        unit.hosts(),
        (from, to) -> {
          for (int slot = from; slot < to; slot++) {
            slots.add(slot);
          }
          return true;
        });
    return slots.build().toArray();
  }

  /** Runs all cells; answers with the slots of the circular ones. */
  BitSet run() {
    Frame frame = runner.frame();
    frame.watcher = this;
    for (int cell = 0; cell < woven.stripOf().length; cell++) {
      if (!done.get(cell)) {
        demand(cell);
      }
    }
    frame.watcher = null;
    BitSet slots = new BitSet();
    circular.stream().forEach(cell -> java.util.Arrays.stream(slots(cell)).forEach(slots::set));
    return slots;
  }

  private void demand(int first) {
    push(first);
    while (!waiting.isEmpty()) {
      int cell = waiting.peek();
      try {
        if (!done.get(cell)) {
          int strip = woven.stripOf()[cell];
          runner.cell(
              woven.unitOfStrip().get(strip), woven.strips().get(strip), woven.positions()[cell]);
          done.set(cell);
        }
        waitingCells.clear(waiting.pop());
      } catch (Waiting e) {
        int needed = cellOf.get(e.slot);
        if (waitingCells.get(needed)) {
          close(needed);
        } else {
          push(needed);
        }
      }
    }
  }

  private void push(int cell) {
    waiting.push(cell);
    waitingCells.set(cell);
  }

  /** All that wait for the cell up to itself are circular. */
  private void close(int cell) {
    for (int member : waiting) {
      circular.set(member);
      done.set(member);
      if (member == cell) {
        return;
      }
    }
  }

  @Override
  public void reads(int slot) {
    Integer cell = cellOf.get(slot);
    if (cell != null && !done.get(cell)) {
      throw new Waiting(slot);
    }
  }

  @Override
  public void reads(CellRange area) {
    layout.runs(
        area,
        (from, to) -> {
          for (int slot = from; slot < to; slot++) {
            reads(slot);
          }
          return true;
        });
  }
}
