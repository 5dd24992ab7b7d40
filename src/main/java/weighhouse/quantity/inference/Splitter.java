package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.algebra.Algebra;
import weighhouse.quantity.label.Guess;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Cuts lines of one formula where it gives different quantities along the line. */
final class Splitter {
  private static final int MOST_ROUNDS = 3;

  private final Units units;
  private final Links links;
  private final Algebra algebra;
  private final UnitOperands operands;

  Splitter(Units units, Links links, Algebra algebra, UnitOperands operands) {
    this.units = units;
    this.links = links;
    this.algebra = algebra;
    this.operands = operands;
  }

  void split(Fixpoint fixpoint, Function<Unit, Guess> guess) {
    boolean changed = true;
    for (int round = 0; round < MOST_ROUNDS && changed; round++) {
      List<Unit> added = new ArrayList<>();
      for (Unit unit : List.copyOf(units.all())) {
        if (unit.isCalculated() && isLine(unit.range) && units.at(unit.host()) == unit) {
          split(unit, guess, added);
        }
      }
      changed = !added.isEmpty();
      if (changed) {
        links.grow(added);
        fixpoint.run();
      }
    }
  }

  private static boolean isLine(CellRange range) {
    return range.size() > 1 && (range.rows() == 1 || range.columns() == 1);
  }

  private void split(Unit unit, Function<Unit, Guess> guess, List<Unit> added) {
    Lines lines = new Lines(unit.range.columns() == 1);
    int length = lines.length(unit.range);
    List<Integer> starts = starts(unit, lines, length);
    for (int i = 1; i < starts.size(); i++) {
      int end = i + 1 < starts.size() ? starts.get(i + 1) : length;
      CellAddress first = lines.later(unit.host(), starts.get(i));
      CellAddress last = lines.later(unit.host(), end - 1);
      CellRange range =
          new CellRange(first.sheet(), first.row(), first.column(), last.row(), last.column());
      Unit part = units.add(range, unit.tree);
      part.structural = unit.structural;
      part.structure = unit.structure;
      part.trace = unit.trace;
      part.guess = guess.apply(part);
      added.add(part);
    }
  }

  /** Where along the line another kind begins. */
  private List<Integer> starts(Unit unit, Lines lines, int length) {
    List<Integer> starts = new ArrayList<>(List.of(0));
    Quantity current = unit.up;
    int at = next(unit, lines, 0, length);
    while (at < length) {
      Quantity here = algebra.quantity(unit.tree, lines.later(unit.host(), at));
      if (here.kind() != current.kind() || here.role() != current.role()) {
        starts.add(at);
        current = here;
      }
      at = next(unit, lines, at, length);
    }
    return starts;
  }

  /** The next cell along the line that reads another unit somewhere. */
  private int next(Unit unit, Lines lines, int at, int length) {
    CellAddress host = lines.later(unit.host(), at);
    List<CellRange> here = operands.resolver().ranges(unit.tree, host);
    List<CellRange> later = operands.resolver().ranges(unit.tree, lines.later(host, 1));
    int next = length;
    for (int i = 0; i < Math.min(here.size(), later.size()); i++) {
      CellRange read = here.get(i);
      boolean follows = read.size() == 1 && !read.equals(later.get(i));
      if (follows) {
        next = Math.min(next, at + ahead(units.at(read.first()), read.first(), lines));
      }
    }
    return next;
  }

  /** Cells from the one read to the end of its unit along the line; at least 1. */
  private static int ahead(Unit operand, CellAddress from, Lines lines) {
    if (operand == null) {
      return 1;
    }
    CellRange range = operand.range;
    int ahead = lines.down() ? range.lastRow() - from.row() : range.lastColumn() - from.column();
    return Math.max(0, ahead) + 1;
  }
}
