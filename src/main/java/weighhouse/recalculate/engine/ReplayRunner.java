package weighhouse.recalculate.engine;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.program.Frame;
import weighhouse.recalculate.program.Node;

/** Runs cells and sets their results aside: a stored value stays for those that read it. */
final class ReplayRunner extends Runner {
  private final CellState state;
  private final CellState stored;
  private final CellState results;

  ReplayRunner(Frame frame, CellState stored) {
    super(frame, (from, to) -> true);
    this.state = frame.state();
    this.stored = stored;
    this.results = stored.copy();
  }

  CellState results() {
    return results;
  }

  @Override
  void one(Node root, int slot) {
    super.one(root, slot);
    setAside(slot);
  }

  @Override
  void put(int slot, Value value) {
    super.put(slot, value);
    setAside(slot);
  }

  private void setAside(int slot) {
    results.take(state, slot, slot, 1);
    if (!stored.isBlank(slot)) {
      state.take(stored, slot, slot, 1);
    }
  }
}
