package weighhouse.recalculate.order;

import weighhouse.formula.Axis;
import weighhouse.recalculate.program.Footprint;
import weighhouse.workbook.CellRange;

/** How the cells of a unit read each other. */
enum Running {
  /** Not at all. */
  NONE,
  /** Only cells before them, strip after strip, first to last. */
  FORWARD,
  /** In some other way. */
  ANY;

  static Running of(Unit unit) {
    Running running = NONE;
    for (Footprint read : unit.reads()) {
      CellRange hosts = unit.seenFrom();
      if (Plan.meet(read.hull(hosts), unit.hosts()) && read.readers(hosts, unit.hosts()) != null) {
        if (unit.whole() || !before(read, hosts)) {
          return ANY;
        }
        running = FORWARD;
      }
    }
    return running;
  }

  /** Whether it reads only cells above in the same column, or to the left in the same row. */
  private static boolean before(Footprint read, CellRange hosts) {
    boolean sameColumn = same(read.column1(), read.column2()) || hosts.columns() == 1;
    boolean sameRow = same(read.row1(), read.row2()) || hosts.rows() == 1;
    boolean above = before(read.row1(), hosts.firstRow()) && before(read.row2(), hosts.firstRow());
    boolean left =
        before(read.column1(), hosts.firstColumn()) && before(read.column2(), hosts.firstColumn());
    return (sameColumn && above) || (sameRow && left);
  }

  private static boolean same(Axis first, Axis second) {
    return !first.absolute() && first.value() == 0 && first.equals(second);
  }

  private static boolean before(Axis end, int firstHost) {
    return end.absolute() ? end.value() < firstHost : end.value() < 0;
  }
}
