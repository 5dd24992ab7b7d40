package weighhouse.rules.pattern;

import weighhouse.formula.Expr;
import weighhouse.formula.Trees;

/**
 * The operand is one number for the whole model, every reference in it being absolute or a name; or
 * else it is not.
 *
 * @param wanted whether it has to be
 */
public record FixedCondition(boolean wanted) implements Condition {
  @Override
  public boolean holds(Bound bound, Situation situation) {
    return wanted != Trees.contains(bound.operand(), FixedCondition::slides);
  }

  private static boolean slides(Expr node) {
    return node instanceof Expr.CellRef cell
        && !(cell.row().absolute() && cell.column().absolute());
  }
}
