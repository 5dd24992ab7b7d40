package weighhouse.audit.pipeline;

import java.util.Optional;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;

/**
 * The correction of any formula in which a ratio acts on the risk, whatever its make: the formula
 * with the ratio at 1 is the baseline probability, to which the ratio is then applied on its scale.
 */
final class OnHazard {
  private static final Expr ONE = new Expr.Num(1, "1");

  private OnHazard() {}

  /** The whole corrected formula; empty where the rule does not ask for the hazard scale. */
  static Optional<Expr> rewrite(String rule, Expr tree, Expr ratio) {
    if (!rule.equals("hazard-ratio-times-probability")
        && !rule.equals("mortality-ratio-times-probability")) {
      return Optional.empty();
    }
    Expr baseline = Trees.map(tree, node -> node.equals(ratio) ? ONE : node);
    Expr staying = new Expr.Paren(new Expr.Binary(BinaryOp.SUBTRACT, ONE, grouped(baseline)));
    return Optional.of(
        new Expr.Binary(BinaryOp.SUBTRACT, ONE, new Expr.Binary(BinaryOp.POWER, staying, ratio)));
  }

  private static Expr grouped(Expr tree) {
    return Trees.children(tree).isEmpty() || tree instanceof Expr.Call
        ? tree
        : new Expr.Paren(tree);
  }
}
