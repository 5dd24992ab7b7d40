package weighhouse.recalculate.program;

import java.util.ArrayList;
import java.util.List;
import weighhouse.recalculate.cells.Layout;
import weighhouse.workbook.CellRange;

/**
 * Host cells of one program next to each other on a line of their sheet, with the slots of what
 * they read worked out.
 */
public final class Strip {
  private final CellRange hosts;
  private final boolean across;
  private final int[] bases;
  private final List<int[]> scattered = new ArrayList<>();
  private final int slot;

  /**
   * @param hosts cells of one line of the sheet
   */
  public Strip(Program program, CellRange hosts, Layout layout) {
    this.hosts = hosts;
    this.across = layout.across(hosts.sheet());
    this.slot = layout.slot(hosts.sheet(), hosts.firstRow(), hosts.firstColumn());
    List<Footprint> cells = program.cells();
    this.bases = new int[cells.size()];
    for (int k = 0; k < bases.length; k++) {
      bases[k] = base(cells.get(k), layout);
    }
  }

  private int base(Footprint read, Layout layout) {
    CellRange hull = read.hull(hosts);
    boolean fixed = moves(read) == 0 || hosts.size() == 1;
    if (!read.wraps(hosts) && (fixed || along(hull, layout))) {
      return layout.slot(hull.sheet(), hull.firstRow(), hull.firstColumn());
    }
    int[] slots = new int[length()];
    for (int i = 0; i < slots.length; i++) {
      CellRange cell = read.at(row(i), column(i));
      slots[i] = layout.slot(cell.sheet(), cell.firstRow(), cell.firstColumn());
    }
    scattered.add(slots);
    return -scattered.size();
  }

  private int moves(Footprint read) {
    boolean moving = across ? !read.column1().absolute() : !read.row1().absolute();
    return moving ? 1 : 0;
  }

  private boolean along(CellRange read, Layout layout) {
    boolean readAcross = layout.across(read.sheet());
    if (readAcross != across) {
      return false;
    }
    int line = across ? read.firstRow() : read.firstColumn();
    return across
        ? layout.together(read.sheet(), line, read.firstColumn(), read.lastColumn())
        : layout.together(read.sheet(), line, read.firstRow(), read.lastRow());
  }

  public int length() {
    return across ? hosts.columns() : hosts.rows();
  }

  public CellRange hosts() {
    return hosts;
  }

  /** Slot of the first host; the others follow. */
  public int slot() {
    return slot;
  }

  int[] bases() {
    return bases;
  }

  int[] scattered(int index) {
    return scattered.get(index);
  }

  int sheet() {
    return hosts.sheet();
  }

  int row(int position) {
    return across ? hosts.firstRow() : hosts.firstRow() + position;
  }

  int column(int position) {
    return across ? hosts.firstColumn() + position : hosts.firstColumn();
  }
}
