package weighhouse.recalculate.program;

import java.util.List;
import weighhouse.recalculate.cells.CellGrid;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.cells.JoinedGrid;
import weighhouse.recalculate.cells.Layout;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Reference;
import weighhouse.recalculate.functions.Surroundings;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Where a program runs: the cells' values and the host cell. A strip of hosts is entered once, then
 * walked by {@link #at}. For use by one thread at a time.
 */
@SuppressWarnings("MemberName")
public final class Frame {
  /** Told of every read, where someone must know; null in ordinary runs. */
  public Watcher watcher;

  /** Seed of a draw; random functions and the clock run only where their program is run. */
  public long seed;

  final Surroundings surroundings;
  final CellState state;
  final double[] numbers;
  final Layout layout;
  final Object[] locals = new Object[MOST_LOCALS];

  /** Position of the host on its strip. */
  int at;

  /** Slot of each single-cell read at the strip's start; a negative one counts into scattered. */
  int[] bases;

  private static final int MOST_LOCALS = 256;

  private Strip strip;
  private int draws;

  public Frame(Layout layout, CellState state, Names names) {
    this.surroundings = new HostSurroundings(this, names);
    this.layout = layout;
    this.state = state;
    this.numbers = state.numbers;
  }

  public CellState state() {
    return state;
  }

  public Layout layout() {
    return layout;
  }

  /** Enters a strip; {@link #moveTo} then goes to a host on it. */
  public void enter(Strip entered) {
    strip = entered;
    bases = entered.bases();
    at = 0;
  }

  public void moveTo(int position) {
    at = position;
    draws = 0;
  }

  int row() {
    return strip.row(at);
  }

  int column() {
    return strip.column(at);
  }

  int sheet() {
    return strip.sheet();
  }

  CellAddress host() {
    return new CellAddress(sheet(), row(), column());
  }

  int slot(int read) {
    int base = bases[read];
    if (base >= 0) {
      return base;
    }
    return strip.scattered(-1 - base)[at];
  }

  int slotAlong(int read) {
    int base = bases[read];
    if (base >= 0) {
      return base + at;
    }
    return strip.scattered(-1 - base)[at];
  }

  /** The cells of a reference; to be read at once. */
  Grid cells(Reference reference) {
    List<CellRange> areas = reference.areas();
    if (areas.size() == 1) {
      return cells(areas.get(0));
    }
    return new JoinedGrid(areas.stream().map(this::cells).toList());
  }

  private Grid cells(CellRange area) {
    if (watcher != null) {
      watcher.reads(area);
    }
    return new CellGrid(layout, state, area);
  }

  /** A number between 0 and 1 that depends on seed, host and how many were drawn in it before. */
  double random() {
    long mixed = seed;
    mixed = mix(mixed + sheet());
    mixed = mix(mixed + ((long) row() << 20 | column()));
    mixed = mix(mixed + draws++);
    return ((mixed >>> 11) + 0.5) * 0x1p-53;
  }

  /** The finalizer of SplitMix64 (Steele, Lea and Flood 2014). */
  private static long mix(long value) {
    long z = value + 0x9e3779b97f4a7c15L;
    z = (z ^ (z >>> 30)) * 0xbf58476d1ce4e5b9L;
    z = (z ^ (z >>> 27)) * 0x94d049bb133111ebL;
    return z ^ (z >>> 31);
  }

  /** Someone who must know what a formula reads. */
  public interface Watcher {
    void reads(int slot);

    void reads(CellRange area);
  }
}
