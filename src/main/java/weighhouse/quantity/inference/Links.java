package weighhouse.quantity.inference;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Which units read which. */
final class Links {
  /** A formula that reads more units than this reads data; a sample of it will do. */
  private static final int MOST_READ = 256;

  private final Units units;
  private final UnitOperands operands;
  private int[][] dependents;

  Links(Units units, UnitOperands operands) {
    this.units = units;
    this.operands = operands;
    dependents = new int[units.size()][];
    for (Unit unit : units.all()) {
      if (unit.isCalculated()) {
        connect(unit);
      }
    }
  }

  private void connect(Unit unit) {
    Set<Integer> read = new HashSet<>();
    List<CellRange> first = operands.resolver().ranges(unit.tree, unit.host());
    List<CellRange> last = operands.resolver().ranges(unit.tree, unit.range.last());
    for (int i = 0; i < first.size(); i++) {
      CellRange hull = i < last.size() ? hull(first.get(i), last.get(i)) : first.get(i);
      units.in(hull, MOST_READ).forEach(other -> read.add(other.id));
    }
    for (Expr node : Trees.walk(unit.tree)) {
      if (node instanceof Expr.Call call) {
        looked(call, unit.host())
            .ifPresent(r -> units.in(r, MOST_READ).forEach(u -> read.add(u.id)));
      }
    }
    read.forEach(id -> dependents[id] = with(dependents[id], unit.id));
  }

  private Optional<CellRange> looked(Expr.Call call, CellAddress host) {
    return operands.cells(call, host);
  }

  private static int[] with(int[] ids, int id) {
    if (ids == null) {
      return new int[] {1, id};
    }
    int[] room = ids[0] + 1 < ids.length ? ids : Arrays.copyOf(ids, ids.length * 2);
    room[0]++;
    room[room[0]] = id;
    return room;
  }

  private static CellRange hull(CellRange a, CellRange b) {
    return a.sheet() != b.sheet()
        ? a
        : new CellRange(
            a.sheet(),
            Math.min(a.firstRow(), b.firstRow()),
            Math.min(a.firstColumn(), b.firstColumn()),
            Math.max(a.lastRow(), b.lastRow()),
            Math.max(a.lastColumn(), b.lastColumn()));
  }

  /** Ids of the units whose formulas read the unit. */
  int[] dependents(Unit unit) {
    int[] ids = unit.id < dependents.length ? dependents[unit.id] : null;
    return ids == null ? new int[0] : Arrays.copyOfRange(ids, 1, ids[0] + 1);
  }

  /** Takes in units that were made since. */
  void grow(List<Unit> added) {
    dependents = Arrays.copyOf(dependents, units.size());
    added.stream().filter(Unit::isCalculated).forEach(this::connect);
  }
}
