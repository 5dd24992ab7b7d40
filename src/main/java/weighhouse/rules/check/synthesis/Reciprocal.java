package weighhouse.rules.check.synthesis;

import java.util.Optional;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.workbook.CellAddress;

/**
 * A cell that is one over another.
 *
 * @param node the reciprocal as written
 * @param of what is turned round
 * @param cell where that stands
 */
public record Reciprocal(Expr node, Expr of, CellAddress cell) {

  /** Reads the formula of a cell: {@code 1/x}, {@code x^-1} or {@code EXP(-LN(x))}. */
  public static Optional<Reciprocal> of(CellAddress host, ModelView model) {
    Expr formula = model.formula(host);
    if (formula == null) {
      return Optional.empty();
    }
    for (Expr result : Parts.results(formula)) {
      Expr of = turnedRound(result);
      CellAddress cell = of == null ? null : model.cell(of, host);
      if (cell != null) {
        return Optional.of(new Reciprocal(result, of, cell));
      }
    }
    return Optional.empty();
  }

  private static Expr turnedRound(Expr node) {
    if (Parts.is(node, BinaryOp.DIVIDE)) {
      return isNumber(Parts.left(node), 1) ? Parts.right(node) : null;
    } else if (Parts.is(node, BinaryOp.POWER)) {
      return isMinusOne(Parts.right(node)) ? Parts.left(node) : null;
    }
    boolean exp = node instanceof Expr.Call call && call.function().equals("EXP");
    Expr negated = exp ? negated(Parts.argument(node, 0)) : null;
    boolean ln = negated instanceof Expr.Call call && call.function().equals("LN");
    return ln ? Parts.argument(negated, 0) : null;
  }

  private static Expr negated(Expr node) {
    return node instanceof Expr.Unary unary && unary.op() == UnaryOp.MINUS
        ? Trees.inside(unary.operand())
        : null;
  }

  private static boolean isMinusOne(Expr node) {
    return isNumber(node, -1) || isNumber(negated(node), 1);
  }

  private static boolean isNumber(Expr node, double value) {
    return node instanceof Expr.Num number && number.value() == value;
  }
}
