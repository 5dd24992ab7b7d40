package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.ToDoubleFunction;
import weighhouse.formula.Axis;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;

/**
 * Recognises cohort traces: neighbouring lines of formulas that carry the cycle before on and whose
 * sum stays the same, or that start from a whole cohort in one state.
 */
final class Traces {
  private static final int SHORTEST = 3;
  private static final int MOST_STATES = 16;
  private static final double ROUNDING = 1e-6;

  /** A state of a faulty model may hold more than the whole cohort, but not much more. */
  private static final double MOST_LEAKING = 1.5;

  private final Units units;
  private final ToDoubleFunction<CellAddress> numbers;

  Traces(Units units, ToDoubleFunction<CellAddress> numbers) {
    this.units = units;
    this.numbers = numbers;
  }

  void mark() {
    for (Unit unit : List.copyOf(units.all())) {
      mark(unit, new Lines(true));
      mark(unit, new Lines(false));
    }
  }

  private void mark(Unit unit, Lines lines) {
    if (unit.structural != Kind.UNKNOWN || !unit.isCalculated()) {
      return;
    }
    if (isMatrixTrace(unit, lines)) {
      List<Unit> alone = List.of(unit);
      occupied(alone, lines);
    } else if (isCandidate(unit, lines)) {
      List<Unit> window = window(unit, lines);
      if (!window.isEmpty()) {
        occupied(window, lines);
      }
    }
  }

  private static boolean isCandidate(Unit unit, Lines lines) {
    return lines.isLine(unit.range) && lines.length(unit.range) >= SHORTEST;
  }

  /** The shortest group of neighbours from this unit on that makes a trace; empty if none does. */
  private List<Unit> window(Unit first, Lines lines) {
    boolean carried = carriesOn(first, lines);
    if (!carried && !isRest(first)) {
      return List.of(); // probabilities that change with time stand before the states
    }
    List<Unit> window = new ArrayList<>(List.of(first));
    for (int k = 1; k < MOST_STATES; k++) {
      Unit next = units.at(lines.beside(first.host(), k));
      if (next == null || !isCandidate(next, lines) || !aligned(first, next, lines)) {
        return List.of();
      }
      window.add(next);
      carried |= carriesOn(next, lines);
      if (carried && (sumStays(window, lines) || startsWhole(window, lines))) {
        return window;
      }
    }
    return List.of();
  }

  private static boolean aligned(Unit a, Unit b, Lines lines) {
    return lines.length(a.range) == lines.length(b.range)
        && (lines.down()
            ? a.range.firstRow() == b.range.firstRow()
            : a.range.firstColumn() == b.range.firstColumn());
  }

  /**
   * Whether the formula multiplies what stands in its own line or a neighbour's one cycle before.
   */
  private static boolean carriesOn(Unit unit, Lines lines) {
    List<Expr> nodes = Trees.walk(unit.tree);
    boolean before = nodes.stream().anyMatch(node -> isBefore(node, lines));
    return before && nodes.stream().anyMatch(Traces::multiplies);
  }

  /** Whether the formula is what others leave, {@code 1-SUM(...)} or {@code 1-a-b}, and no more. */
  private static boolean isRest(Unit unit) {
    return Trees.inside(unit.tree) instanceof Expr.Binary b
        && b.op() == BinaryOp.SUBTRACT
        && !Trees.contains(unit.tree, Traces::isProductOrPower);
  }

  private static boolean isProductOrPower(Expr node) {
    return node instanceof Expr.Binary b && b.op().binding() > BinaryOp.SUBTRACT.binding();
  }

  private static boolean multiplies(Expr node) {
    return (node instanceof Expr.Binary b && b.op() == BinaryOp.MULTIPLY)
        || (node instanceof Expr.Call c
            && List.of("SUMPRODUCT", "MMULT", "PRODUCT").contains(c.function()));
  }

  private static boolean isBefore(Expr node, Lines lines) {
    if (node instanceof Expr.CellRef cell && cell.sheet() == null) {
      return isBefore(lines.down() ? cell.row() : cell.column())
          && isNear(lines.down() ? cell.column() : cell.row());
    }
    return node instanceof Expr.AreaRef area
        && area.sheet() == null
        && (lines.down()
            ? isBefore(area.row1()) && isBefore(area.row2())
            : isBefore(area.column1()) && isBefore(area.column2()));
  }

  private static boolean isBefore(Axis axis) {
    return !axis.absolute() && axis.value() == -1;
  }

  private static boolean isNear(Axis axis) {
    return axis.absolute() || Math.abs(axis.value()) < MOST_STATES;
  }

  private boolean sumStays(List<Unit> window, Lines lines) {
    int last = lines.length(window.get(0).range) - 1;
    double before = sum(window, lines, 0);
    double middle = sum(window, lines, last / 2);
    double end = sum(window, lines, last);
    boolean stays = before > 0 && near(before, middle) && near(before, end);
    return stays && moves(window, lines, last);
  }

  private boolean moves(List<Unit> window, Lines lines, int last) {
    return window.stream().anyMatch(u -> !near(number(u, lines, 0), number(u, lines, last)));
  }

  /** Whether the cycle before the first has the whole cohort in one state. */
  private boolean startsWhole(List<Unit> window, Lines lines) {
    double[] start = window.stream().mapToDouble(unit -> number(unit, lines, -1)).toArray();
    double whole = Arrays.stream(start).max().orElse(0);
    boolean inOneState = whole > 0 && near(Arrays.stream(start).sum(), whole);
    return inOneState && window.stream().allMatch(u -> fraction(number(u, lines, 0), whole));
  }

  private static boolean fraction(double number, double whole) {
    return Double.isNaN(number) || (number >= -ROUNDING && number <= whole * MOST_LEAKING);
  }

  private double sum(List<Unit> window, Lines lines, int cycle) {
    return window.stream().mapToDouble(unit -> number(unit, lines, cycle)).sum();
  }

  private double number(Unit unit, Lines lines, int cycle) {
    CellAddress cell = lines.later(unit.host(), cycle);
    return cell.row() < 0 || cell.column() < 0 ? Double.NaN : numbers.applyAsDouble(cell);
  }

  private static boolean near(double a, double b) {
    return Math.abs(a - b) <= ROUNDING * Math.max(Math.abs(a), Math.abs(b));
  }

  /** An array formula whose row follows from the row before by a matrix. */
  private static boolean isMatrixTrace(Unit unit, Lines lines) {
    return Trees.inside(unit.tree) instanceof Expr.Call call
        && call.function().equals("MMULT")
        && unit.range.size() > 1
        && Trees.walk(call).stream()
            .anyMatch(node -> node instanceof Expr.AreaRef && isBefore(node, lines));
  }

  private void occupied(List<Unit> window, Lines lines) {
    String where = cells(window);
    for (Unit unit : window) {
      unit.trace = carriesOn(unit, lines);
      settle(unit, where + " carry a cohort from cycle to cycle");
      start(unit, lines, where);
    }
  }

  /** The typed-in shares of the first cycle. */
  private void start(Unit unit, Lines lines, String where) {
    for (int row = 0; row < (lines.down() ? unit.range.columns() : unit.range.rows()); row++) {
      CellAddress before = lines.later(lines.beside(unit.host(), row), -1);
      Unit start = units.at(before);
      if (start != null && start != unit && start.structural == Kind.UNKNOWN) {
        settle(start, "the first cycle of " + where);
      }
    }
  }

  private static void settle(Unit unit, String sentence) {
    unit.structural = Kind.OCCUPANCY;
    unit.structure = sentence;
  }

  private static String cells(List<Unit> window) {
    CellAddress first = window.get(0).range.first();
    CellAddress last = window.get(window.size() - 1).range.last();
    return A1.cell(first.row(), first.column()) + ":" + A1.cell(last.row(), last.column());
  }
}
