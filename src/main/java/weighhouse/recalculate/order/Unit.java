package weighhouse.recalculate.order;

import java.util.ArrayList;
import java.util.List;
import weighhouse.recalculate.cells.Layout;
import weighhouse.recalculate.program.Footprint;
import weighhouse.recalculate.program.Program;
import weighhouse.recalculate.program.Strip;
import weighhouse.workbook.CellRange;

/**
 * A rectangle of cells with one program, calculated strip by strip; or the range of an array
 * formula, calculated as one.
 */
public final class Unit {
  private final int shape;
  private final Program program;
  private final CellRange hosts;
  private final boolean whole;
  private final List<Strip> strips;
  private final List<Footprint> reads;

  /**
   * @param shape id of the shape, or negative for a formula put in its place
   * @param whole whether the first cell's result fills the rectangle
   */
  public Unit(int shape, Program program, CellRange hosts, boolean whole, Layout layout) {
    this.shape = shape;
    this.program = program;
    this.hosts = hosts;
    this.whole = whole;
    this.strips = whole ? List.of(first(program, hosts, layout)) : strips(program, hosts, layout);
    List<Footprint> all = new ArrayList<>(program.cells());
    all.addAll(program.ranges());
    this.reads = List.copyOf(all);
  }

  private static Strip first(Program program, CellRange hosts, Layout layout) {
    return new Strip(program, CellRange.of(hosts.first()), layout);
  }

  private static List<Strip> strips(Program program, CellRange hosts, Layout layout) {
    List<Strip> strips = new ArrayList<>();
    if (layout.across(hosts.sheet())) {
      for (int r = hosts.firstRow(); r <= hosts.lastRow(); r++) {
        CellRange line =
            new CellRange(hosts.sheet(), r, hosts.firstColumn(), r, hosts.lastColumn());
        strips.add(new Strip(program, line, layout));
      }
    } else {
      for (int c = hosts.firstColumn(); c <= hosts.lastColumn(); c++) {
        CellRange line = new CellRange(hosts.sheet(), hosts.firstRow(), c, hosts.lastRow(), c);
        strips.add(new Strip(program, line, layout));
      }
    }
    return List.copyOf(strips);
  }

  public int shape() {
    return shape;
  }

  public Program program() {
    return program;
  }

  public CellRange hosts() {
    return hosts;
  }

  public boolean whole() {
    return whole;
  }

  public List<Strip> strips() {
    return strips;
  }

  /** All that the program reads; of a whole unit relative to its first cell. */
  public List<Footprint> reads() {
    return reads;
  }

  /** The cells that a footprint is seen from. */
  CellRange seenFrom() {
    return whole ? CellRange.of(hosts.first()) : hosts;
  }

  /** Those of the unit's cells that must be calculated when a rectangle changes, or null. */
  public CellRange readers(Footprint read, CellRange changed) {
    CellRange readers = read.readers(seenFrom(), changed);
    return readers == null || !whole ? readers : hosts;
  }
}
