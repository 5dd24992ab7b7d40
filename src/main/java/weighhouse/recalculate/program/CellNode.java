package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Reference;

/** A reference to one cell. */
abstract class CellNode extends Node {
  final int read;
  private final Footprint footprint;

  private CellNode(int read, Footprint footprint) {
    this.read = read;
    this.footprint = footprint;
  }

  /**
   * @param read number among the single cells that the program reads
   * @param along whether it moves with the host along its strip
   */
  static CellNode of(int read, Footprint footprint, boolean along) {
    return along ? new Along(read, footprint) : new Fixed(read, footprint);
  }

  abstract int slot(Frame frame);

  final int watched(Frame frame) {
    int slot = slot(frame);
    if (frame.watcher != null) {
      frame.watcher.reads(slot);
    }
    return slot;
  }

  @Override
  public final double plain(Frame frame) {
    int slot = watched(frame);
    return frame.state.isPlain(slot) ? frame.numbers[slot] : Double.NaN;
  }

  @Override
  public final Value value(Frame frame) {
    return frame.state.get(watched(frame));
  }

  @Override
  public final Reference reference(Frame frame) {
    return Reference.of(footprint.at(frame.row(), frame.column()));
  }

  private static final class Fixed extends CellNode {
    Fixed(int read, Footprint footprint) {
      super(read, footprint);
    }

    @Override
    int slot(Frame frame) {
      return frame.slot(read);
    }

    @Override
    public double number(Frame frame) {
      return frame.numbers[watched(frame)];
    }
  }

  private static final class Along extends CellNode {
    Along(int read, Footprint footprint) {
      super(read, footprint);
    }

    @Override
    int slot(Frame frame) {
      return frame.slotAlong(read);
    }

    @Override
    public double number(Frame frame) {
      return frame.numbers[watched(frame)];
    }
  }
}
