package weighhouse.rules.pattern;

import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;

/**
 * The operand is one number for the whole model, every reference in it being absolute or a name; or
 * else it is not.
 *
 * @param wanted whether it has to be
 */
public record FixedCondition(boolean wanted) implements Condition {
  @Override
  public boolean holds(Bound bound, Situation situation) {
    return wanted
        != Trees.contains(
            bound.operand(),
            node -> slides(node, situation.view().scope(), situation.view().host()));
  }

  private static boolean slides(Expr node, ModelScope scope, CellAddress host) {
    if (node instanceof Expr.NameRef) { // of a column, of which each row sees its own cell
      CellAddress here = scope.cell(node, host);
      return here != null
          && !(here.equals(scope.cell(node, host.offset(1, 0)))
              && here.equals(scope.cell(node, host.offset(0, 1))));
    }
    return node instanceof Expr.CellRef cell
        && !(cell.row().absolute() && cell.column().absolute());
  }
}
