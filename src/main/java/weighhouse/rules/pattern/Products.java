package weighhouse.rules.pattern;

import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.UnaryOp;

/** Writes a product from its factors. */
final class Products {
  private static final Expr ONE = new Expr.Num(1, "1");

  private Products() {}

  /** The factors in their order, dividing by those that divide; factors of 1 are left out. */
  static Expr of(List<Factor> factors) {
    boolean negative = factors.stream().filter(Factor::isSign).count() % 2 == 1;
    Expr product = null;
    for (Factor factor : factors) {
      if (factor.isSign() || isOne(factor.node())) {
        continue;
      }
      if (product == null) {
        Expr first = factor.inverse() ? quotient(ONE, factor.node()) : factor.node();
        product = negative ? new Expr.Unary(UnaryOp.MINUS, first) : first;
      } else {
        product =
            factor.inverse()
                ? quotient(product, factor.node())
                : new Expr.Binary(BinaryOp.MULTIPLY, product, factor.node());
      }
    }
    return product == null ? ONE : product;
  }

  private static Expr quotient(Expr above, Expr below) {
    return new Expr.Binary(BinaryOp.DIVIDE, above, below);
  }

  private static boolean isOne(Expr node) {
    return node instanceof Expr.Num number && number.value() == 1;
  }
}
