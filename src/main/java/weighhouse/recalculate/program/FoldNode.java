package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Fold;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Reference;
import weighhouse.workbook.CellRange;

/** SUM, MIN and the like: numbers of ranges straight from the cells' arrays. */
final class FoldNode extends Node {
  private final Fold fold;
  private final Node[] arguments;

  FoldNode(Fold fold, Node[] arguments) {
    this.fold = fold;
    this.arguments = arguments;
  }

  @Override
  public double number(Frame frame) {
    Folded folded = new Folded(fold, frame.state);
    for (Node argument : arguments) {
      if (argument instanceof CellNode cell) {
        int slot = cell.watched(frame);
        folded.slots(slot, slot + 1);
      } else if (argument instanceof ReferenceNode) {
        addReference(argument, frame, folded);
      } else {
        folded.add(argument.plain(frame));
      }
    }
    return folded.result();
  }

  private static void addReference(Node argument, Frame frame, Folded folded) {
    try {
      Reference reference = argument.reference(frame);
      if (reference == null) {
        folded.add(Double.NaN);
        return;
      }
      for (CellRange area : reference.areas()) {
        if (frame.watcher != null) {
          frame.watcher.reads(area);
        }
        frame.layout.runs(area, folded);
      }
    } catch (FaultException e) {
      folded.add(Double.NaN);
    }
  }

  @Override
  public double plain(Frame frame) {
    return number(frame);
  }

  @Override
  public Value value(Frame frame) {
    try {
      Folded folded = new Folded(fold, frame.state);
      for (Node argument : arguments) {
        add(argument, frame, folded);
      }
      return Coerce.of(folded.result());
    } catch (FaultException e) {
      return e.value();
    }
  }

  private static void add(Node argument, Frame frame, Folded folded) {
    Grid grid = argument.grid(frame);
    boolean single = grid instanceof Grid.Single && argument.reference(frame) == null;
    if (single) {
      folded.add(Coerce.number(grid.at(0, 0)));
      return;
    }
    for (int r = 0; r < grid.usedRows(); r++) {
      for (int c = 0; c < grid.usedColumns(); c++) {
        double number = grid.number(r, c);
        if (Double.isNaN(number)) {
          Coerce.sound(grid.at(r, c));
        } else {
          folded.add(number);
        }
      }
    }
  }

  private static final class Folded implements weighhouse.recalculate.cells.Layout.Run {
    private final Fold fold;
    private final CellState state;
    private double folded;
    private boolean any;

    Folded(Fold fold, CellState state) {
      this.fold = fold;
      this.state = state;
      this.folded = fold.start();
    }

    void add(double number) {
      folded = Double.isNaN(number) ? Double.NaN : fold.step(folded, number);
      any = true;
    }

    @Override
    public boolean slots(int from, int to) {
      if (fold == Fold.SUM) {
        return sum(from, to);
      }
      for (int slot = from; slot < to; slot++) {
        if (state.isNumber(slot)) {
          add(state.numbers[slot]);
        } else if (state.isError(slot)) {
          add(Double.NaN);
          return false;
        }
      }
      return true;
    }

    private boolean sum(int from, int to) {
      double sum = folded;
      for (int slot = from; slot < to; slot++) {
        if (state.isNumber(slot)) {
          sum += state.numbers[slot];
        } else if (state.isError(slot)) {
          sum = Double.NaN;
          break;
        }
      }
      folded = sum;
      any = true;
      return !Double.isNaN(sum);
    }

    double result() {
      return any ? folded : 0;
    }
  }
}
