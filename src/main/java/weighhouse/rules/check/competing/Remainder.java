package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.Chains;
import weighhouse.workbook.CellAddress;

/**
 * The chance of staying, written as one minus several exits: {@code 1-a-b}, {@code 1-(a+b)}, {@code
 * 1-SUM(a:b)}.
 *
 * @param node the sum
 * @param exits what is taken off, in the order as written
 */
record Remainder(Expr node, List<Expr> exits) {
  private static final int MOST_EXITS = 24;

  /** The remainders of probabilities in a formula. */
  static List<Remainder> in(Expr tree, CellAddress host, Survey survey) {
    List<Remainder> found = new ArrayList<>();
    collect(Trees.inside(tree), host, survey, found);
    return found;
  }

  private static void collect(Expr node, CellAddress host, Survey survey, List<Remainder> found) {
    if (Chains.isSum(node)) {
      List<Expr> exits = exits(node, host);
      boolean known = exits.stream().anyMatch(exit -> survey.kind(exit, host) == Kind.PROBABILITY);
      if (exits.size() > 1 && known) {
        found.add(new Remainder(node, exits));
      }
      Chains.addends(node).forEach(a -> collect(a.node(), host, survey, found));
    } else {
      Trees.children(node).forEach(c -> collect(Trees.inside(c), host, survey, found));
    }
  }

  /** What a sum takes off 1; empty where it is another sum. */
  private static List<Expr> exits(Expr sum, CellAddress host) {
    List<Expr> exits = new ArrayList<>();
    boolean fromOne = false;
    for (Chains.Addend addend : Chains.addends(sum)) {
      if (addend.negative()) {
        exits.addAll(single(addend.node(), host));
      } else if (!fromOne && addend.node() instanceof Expr.Num number && number.value() == 1) {
        fromOne = true;
      } else {
        return List.of();
      }
    }
    return fromOne && exits.size() <= MOST_EXITS ? exits : List.of();
  }

  /** The operands of a SUM, its areas cell by cell; of anything else, itself. */
  private static List<Expr> single(Expr exit, CellAddress host) {
    if (!(exit instanceof Expr.Call call) || !call.function().equals("SUM")) {
      return List.of(exit);
    }
    List<Expr> all = new ArrayList<>();
    for (Expr argument : call.arguments()) {
      all.addAll(argument instanceof Expr.AreaRef area ? cells(area, host) : List.of(argument));
    }
    return all;
  }

  private static List<Expr> cells(Expr.AreaRef area, CellAddress host) {
    List<Expr> cells = new ArrayList<>();
    int rows = area.row2().resolve(host.row()) - area.row1().resolve(host.row());
    int columns = area.column2().resolve(host.column()) - area.column1().resolve(host.column());
    for (int row = 0; row <= rows && cells.size() <= MOST_EXITS; row++) {
      for (int column = 0; column <= columns && cells.size() <= MOST_EXITS; column++) {
        cells.add(new Expr.CellRef(area.sheet(), on(area.row1(), row), on(area.column1(), column)));
      }
    }
    return cells;
  }

  private static Axis on(Axis axis, int steps) {
    return new Axis(axis.value() + steps, axis.absolute());
  }
}
