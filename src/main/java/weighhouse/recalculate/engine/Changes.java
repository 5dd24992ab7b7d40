package weighhouse.recalculate.engine;

import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Strip;
import weighhouse.workbook.CellRange;

/** Where a what-if's values differ from the base. */
final class Changes {
  private final Scratch scratch;

  Changes(Scratch scratch) {
    this.scratch = scratch;
  }

  /** A rectangle that holds all changed cells of a unit among the given ones, or null. */
  CellRange in(Unit unit, CellRange cells) {
    if (unit.whole()) {
      return unit.hosts();
    }
    CellRange changed = null;
    for (Strip strip : unit.strips()) {
      CellRange part = in(strip, cells);
      if (part != null) {
        changed = changed == null ? part : hull(changed, part);
      }
    }
    return changed;
  }

  private CellRange in(Strip strip, CellRange cells) {
    CellRange hosts = strip.hosts();
    int top = Math.max(hosts.firstRow(), cells.firstRow());
    int left = Math.max(hosts.firstColumn(), cells.firstColumn());
    int bottom = Math.min(hosts.lastRow(), cells.lastRow());
    int right = Math.min(hosts.lastColumn(), cells.lastColumn());
    if (top > bottom || left > right) {
      return null;
    }
    boolean down = hosts.columns() == 1;
    int start = strip.slot() + (down ? top - hosts.firstRow() : left - hosts.firstColumn());
    int first = start;
    int last = start + (down ? bottom - top : right - left);
    while (first <= last && same(first)) {
      first++;
    }
    while (last >= first && same(last)) {
      last--;
    }
    if (first > last) {
      return null;
    }
    int from = first - start;
    int to = last - start;
    return down
        ? new CellRange(hosts.sheet(), top + from, left, top + to, left)
        : new CellRange(hosts.sheet(), top, left + from, top, left + to);
  }

  private boolean same(int slot) {
    return scratch.state().same(slot, scratch.base(), slot);
  }

  static CellRange hull(CellRange a, CellRange b) {
    return new CellRange(
        a.sheet(),
        Math.min(a.firstRow(), b.firstRow()),
        Math.min(a.firstColumn(), b.firstColumn()),
        Math.max(a.lastRow(), b.lastRow()),
        Math.max(a.lastColumn(), b.lastColumn()));
  }
}
