package weighhouse.recalculate.engine;

import java.util.BitSet;
import java.util.Set;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.order.Step;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Frame;
import weighhouse.recalculate.program.Node;
import weighhouse.recalculate.program.Strip;
import weighhouse.workbook.CellRange;

/** Runs cells in a frame and stores what they give. */
class Runner {
  private final Frame frame;
  private final CellState state;
  private final Touched touched;
  private final Pointed pointed = new Pointed();

  /**
   * @param touched told which slots are written
   */
  Runner(Frame frame, Touched touched) {
    this.frame = frame;
    this.state = frame.state();
    this.touched = touched;
  }

  Frame frame() {
    return frame;
  }

  /** Runs the cells of a unit from the first of a rectangle on, in their order. */
  void sweep(Unit unit, CellRange from, boolean running) {
    if (unit.whole()) {
      fill(unit);
      return;
    }
    boolean across = frame.layout().across(unit.hosts().sheet());
    for (Strip strip : unit.strips()) {
      CellRange hosts = strip.hosts();
      int line = across ? hosts.firstRow() : hosts.firstColumn();
      int firstLine = across ? from.firstRow() : from.firstColumn();
      int lastLine = across ? from.lastRow() : from.lastColumn();
      int start = across ? hosts.firstColumn() : hosts.firstRow();
      int first = (across ? from.firstColumn() : from.firstRow()) - start;
      int last = (across ? from.lastColumn() : from.lastRow()) - start;
      if (running && line >= firstLine) {
        run(
            unit,
            strip,
            line == firstLine || unit.strips().size() == 1 ? first : 0,
            strip.length() - 1);
      } else if (line >= firstLine && line <= lastLine) {
        run(unit, strip, first, last);
      }
    }
  }

  private void run(Unit unit, Strip strip, int first, int last) {
    if (unit.program().pointing()) {
      for (int i = first; i <= last; i++) {
        cell(unit, strip, i);
      }
      touched.slots(strip.slot() + first, strip.slot() + last + 1);
      return;
    }
    Node root = unit.program().root();
    frame.enter(strip);
    int slot = strip.slot();
    touched.slots(slot + first, slot + last + 1);
    for (int i = first; i <= last; i++) {
      frame.moveTo(i);
      one(root, slot + i);
    }
  }

  /** Runs one cell of a strip, or a unit that is calculated as one. */
  void cell(Unit unit, Strip strip, int position) {
    if (unit.whole()) {
      fill(unit);
      return;
    }
    boolean noted = unit.program().pointing() && frame.watcher == null;
    if (noted) {
      pointed.start(unit, strip, position);
      frame.watcher = pointed;
    }
    frame.enter(strip);
    frame.moveTo(position);
    one(unit.program().root(), strip.slot() + position);
    if (noted) {
      frame.watcher = null;
    }
  }

  /** What cells were seen to read that shows only when they run. */
  Pointed pointed() {
    return pointed;
  }

  void one(Node root, int slot) {
    double number = root.plain(frame);
    if (Math.abs(number) <= Double.MAX_VALUE) {
      state.setNumber(slot, number);
    } else {
      state.set(slot, root.result(frame));
    }
  }

  /** Runs all cells of a weave, but for units that keep theirs; answers with circular slots. */
  BitSet weave(Step.Woven woven, Set<Unit> kept) {
    for (Strip strip : woven.strips()) {
      touched.slots(strip.slot(), strip.slot() + strip.length());
    }
    if (woven.circular()) {
      return new Circles(woven, this, kept).run();
    }
    Strip[] strips = woven.strips().toArray(Strip[]::new);
    Unit[] units = woven.unitOfStrip().toArray(Unit[]::new);
    boolean[] skipped = new boolean[units.length];
    for (int s = 0; s < units.length; s++) {
      skipped[s] = kept.contains(units[s]);
    }
    int[] stripOf = woven.stripOf();
    int[] positions = woven.positions();
    for (int k = 0; k < stripOf.length; k++) {
      if (!skipped[stripOf[k]]) {
        cell(units[stripOf[k]], strips[stripOf[k]], positions[k]);
      }
    }
    return new BitSet();
  }

  private void fill(Unit unit) {
    frame.enter(unit.strips().get(0));
    frame.moveTo(0);
    Value value = unit.program().root().value(frame);
    CellRange hosts = unit.hosts();
    frame.layout().runs(hosts, touched::slots);
    for (int r = 0; r < hosts.rows(); r++) {
      for (int c = 0; c < hosts.columns(); c++) {
        int slot =
            frame.layout().slot(hosts.sheet(), hosts.firstRow() + r, hosts.firstColumn() + c);
        Value element = element(value, r, c);
        put(slot, element instanceof Value.Blank ? new Value.Num(0) : element);
      }
    }
  }

  void put(int slot, Value value) {
    state.set(slot, value);
  }

  private static Value element(Value value, int row, int column) {
    if (!(value instanceof Value.Array array)) {
      return value;
    }
    Value[][] rows = array.rows();
    int r = rows.length == 1 ? 0 : row;
    if (r >= rows.length) {
      return Fault.NA.value();
    }
    int c = rows[r].length == 1 ? 0 : column;
    return c < rows[r].length ? rows[r][c] : Fault.NA.value();
  }

  /** Told which slots are written. */
  interface Touched {
    boolean slots(int from, int to);
  }
}
