package weighhouse.recalculate.program;

import weighhouse.formula.Axis;
import weighhouse.workbook.CellRange;

/**
 * Cells that a formula reads, relative to its host: a rectangle between two corners that each stay
 * or move along.
 */
public record Footprint(int sheet, Axis row1, Axis column1, Axis row2, Axis column2) {
  static final int ROWS = 1_048_576;
  static final int COLUMNS = 16_384;

  /** One that does not move. */
  public static Footprint fixed(CellRange range) {
    return new Footprint(
        range.sheet(),
        new Axis(range.firstRow(), true),
        new Axis(range.firstColumn(), true),
        new Axis(range.lastRow(), true),
        new Axis(range.lastColumn(), true));
  }

  /** Whether both corners are one cell. */
  public boolean single() {
    return row1.equals(row2) && column1.equals(column2);
  }

  /** What the formula reads in a host cell; beyond the sheet's edge it goes on at the other. */
  public CellRange at(int row, int column) {
    int r1 = Math.floorMod(row1.resolve(row), ROWS);
    int r2 = Math.floorMod(row2.resolve(row), ROWS);
    int c1 = Math.floorMod(column1.resolve(column), COLUMNS);
    int c2 = Math.floorMod(column2.resolve(column), COLUMNS);
    return new CellRange(
        sheet, Math.min(r1, r2), Math.min(c1, c2), Math.max(r1, r2), Math.max(c1, c2));
  }

  /** A rectangle that holds all that the formulas of the hosts read. */
  public CellRange hull(CellRange hosts) {
    int top = Math.min(row1.resolve(hosts.firstRow()), row2.resolve(hosts.firstRow()));
    int bottom = Math.max(row1.resolve(hosts.lastRow()), row2.resolve(hosts.lastRow()));
    int left = Math.min(column1.resolve(hosts.firstColumn()), column2.resolve(hosts.firstColumn()));
    int right = Math.max(column1.resolve(hosts.lastColumn()), column2.resolve(hosts.lastColumn()));
    boolean wraps = top < 0 || bottom >= ROWS;
    boolean wrapsAcross = left < 0 || right >= COLUMNS;
    return new CellRange(
        sheet,
        wraps ? 0 : top,
        wrapsAcross ? 0 : left,
        wraps ? ROWS - 1 : bottom,
        wrapsAcross ? COLUMNS - 1 : right);
  }

  /** Whether it leaves the sheet for some of the hosts. */
  public boolean wraps(CellRange hosts) {
    return row1.resolve(hosts.firstRow()) < 0
        || row2.resolve(hosts.firstRow()) < 0
        || row1.resolve(hosts.lastRow()) >= ROWS
        || row2.resolve(hosts.lastRow()) >= ROWS
        || column1.resolve(hosts.firstColumn()) < 0
        || column2.resolve(hosts.firstColumn()) < 0
        || column1.resolve(hosts.lastColumn()) >= COLUMNS
        || column2.resolve(hosts.lastColumn()) >= COLUMNS;
  }

  /** A rectangle that holds all hosts that read a cell of the given ones, or null. */
  public CellRange readers(CellRange hosts, CellRange read) {
    if (wraps(hosts)) {
      return hosts;
    }
    long rows =
        readers(row1, row2, hosts.firstRow(), hosts.lastRow(), read.firstRow(), read.lastRow());
    long columns =
        readers(
            column1,
            column2,
            hosts.firstColumn(),
            hosts.lastColumn(),
            read.firstColumn(),
            read.lastColumn());
    if (rows < 0 || columns < 0) {
      return null;
    }
    return new CellRange(
        hosts.sheet(), (int) (rows >> 32), (int) (columns >> 32), (int) rows, (int) columns);
  }

  /** First and last host whose stretch between two ends meets the one read, packed; or -1. */
  private static long readers(Axis end1, Axis end2, int first, int last, int from, int to) {
    if (end1.absolute() && end2.absolute()) {
      boolean meets =
          Math.min(end1.value(), end2.value()) <= to
              && Math.max(end1.value(), end2.value()) >= from;
      return meets ? packed(first, last) : -1;
    }
    if (end1.absolute() != end2.absolute()) {
      int fixed = end1.absolute() ? end1.value() : end2.value();
      int moving = end1.absolute() ? end2.value() : end1.value();
      int least = fixed < from ? Math.max(first, from - moving) : first;
      int most = fixed > to ? Math.min(last, to - moving) : last;
      return least <= most ? packed(least, most) : -1;
    }
    int least = Math.max(first, from - Math.max(end1.value(), end2.value()));
    int most = Math.min(last, to - Math.min(end1.value(), end2.value()));
    return least <= most ? packed(least, most) : -1;
  }

  private static long packed(int first, int last) {
    return (long) first << 32 | last;
  }
}
