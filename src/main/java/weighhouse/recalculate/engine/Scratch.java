package weighhouse.recalculate.engine;

import java.util.Map;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.cells.Layout;
import weighhouse.recalculate.program.Frame;
import weighhouse.recalculate.program.Names;
import weighhouse.workbook.CellAddress;

/** A copy of the base values that one what-if at a time works in, and leaves as it was. */
final class Scratch {
  private final Layout layout;
  private final CellState base;
  private final CellState state;
  private final Frame frame;
  private final Stretches stretches = new Stretches();
  private final Runner runner;

  Scratch(Layout layout, CellState base, Names names) {
    this.layout = layout;
    this.base = base;
    this.state = base.copy();
    this.frame = new Frame(layout, state, names);
    this.runner = new Runner(frame, stretches);
  }

  CellState state() {
    return state;
  }

  CellState base() {
    return base;
  }

  Runner runner() {
    return runner;
  }

  Stretches stretches() {
    return stretches;
  }

  void set(int slot, Value value) {
    stretches.slots(slot, slot + 1);
    state.set(slot, value);
  }

  /** What has come out so far. */
  CalculatedValues values(Map<CellAddress, Value> beside) {
    int[] from = stretches.starts();
    CellState[] pieces = new CellState[from.length];
    for (int i = 0; i < from.length; i++) {
      pieces[i] = state.copy(from[i], stretches.end(i));
    }
    return new CalculatedValues(layout, base, from, pieces, beside);
  }

  /** Back to the base values. */
  void reset() {
    int[] from = stretches.starts();
    for (int i = 0; i < from.length; i++) {
      state.take(base, from[i], from[i], stretches.end(i) - from[i]);
    }
    stretches.clear();
    frame.watcher = null;
    runner.pointed().clear();
  }
}
