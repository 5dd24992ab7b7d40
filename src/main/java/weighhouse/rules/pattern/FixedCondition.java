package weighhouse.rules.pattern;

import weighhouse.formula.Expr;
import weighhouse.formula.Trees;

/** The operand is one number for the whole model: every reference in it is absolute or a name. */
public record FixedCondition() implements Condition {
  @Override
  public boolean holds(Bound bound, Situation situation) {
    return !Trees.contains(bound.operand(), FixedCondition::slides);
  }

  private static boolean slides(Expr node) {
    return node instanceof Expr.CellRef cell
        && !(cell.row().absolute() && cell.column().absolute());
  }
}
