package weighhouse.rules.pattern;

import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import weighhouse.formula.Expr;
import weighhouse.quantity.Quantity;

/** Whether the host cell itself is what a pattern asks it to be. */
final class CellCondition {
  private CellCondition() {}

  static boolean holds(Metavariable cell, FormulaView view, ToDoubleFunction<Expr> values) {
    Quantity quantity = view.scope().quantities().at(view.host());
    if (!cell.takes(quantity)) {
      return false;
    }
    Bound itself =
        new Bound(view.term(view.tree()), Wrapping.NONE, view.tree(), List.of(quantity), List.of());
    Situation situation = new Situation(view, Map.of(), values);
    return cell.conditions().stream().allMatch(condition -> condition.holds(itself, situation));
  }
}
