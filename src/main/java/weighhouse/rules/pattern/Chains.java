package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;

/** Products and sums as written, however their operands are grouped. */
public final class Chains {
  private Chains() {}

  /** One operand of a sum as written; a negative one is subtracted. */
  public record Addend(Expr node, boolean negative) {}

  /** The factors of a product from left to right; of anything else, the node alone. */
  public static List<Factor> factors(Expr node) {
    List<Factor> factors = new ArrayList<>();
    collect(node, false, factors);
    return factors;
  }

  private static void collect(Expr node, boolean inverse, List<Factor> factors) {
    Expr inside = Trees.inside(node);
    if (inside instanceof Expr.Binary binary && isProduct(binary)) {
      collect(binary.left(), inverse, factors);
      collect(binary.right(), inverse ^ (binary.op() == BinaryOp.DIVIDE), factors);
    } else if (inside instanceof Expr.Unary unary && unary.op() == UnaryOp.MINUS) {
      factors.add(new Factor(Factor.SIGN, false));
      collect(unary.operand(), inverse, factors);
    } else if (isProduct(inside)) {
      Trees.children(inside).forEach(part -> collect(part, inverse, factors));
    } else {
      factors.add(new Factor(inside, inverse));
    }
  }

  /** Whether the node multiplies or divides. */
  public static boolean isProduct(Expr node) {
    if (node instanceof Expr.Binary binary) {
      return binary.op() == BinaryOp.MULTIPLY || binary.op() == BinaryOp.DIVIDE;
    }
    return node instanceof Expr.Call call
        && (call.function().equals("PRODUCT") || call.function().equals("SUMPRODUCT"))
        && call.arguments().stream().noneMatch(Chains::isArea);
  }

  private static boolean isArea(Expr node) {
    return node instanceof Expr.AreaRef
        || node instanceof Expr.ColumnsRef
        || node instanceof Expr.RowsRef;
  }

  /** The addends of a sum from left to right; of anything else, the node alone. */
  public static List<Addend> addends(Expr node) {
    List<Addend> addends = new ArrayList<>();
    collectAddends(node, false, addends);
    return addends;
  }

  private static void collectAddends(Expr node, boolean negative, List<Addend> addends) {
    Expr inside = Trees.inside(node);
    if (inside instanceof Expr.Binary binary && binary.op() == BinaryOp.ADD) {
      collectAddends(binary.left(), negative, addends);
      collectAddends(binary.right(), negative, addends);
    } else if (inside instanceof Expr.Binary binary && binary.op() == BinaryOp.SUBTRACT) {
      collectAddends(binary.left(), negative, addends);
      collectAddends(binary.right(), !negative, addends);
    } else if (inside instanceof Expr.Unary unary && unary.op() == UnaryOp.MINUS) {
      collectAddends(unary.operand(), !negative, addends);
    } else {
      addends.add(new Addend(inside, negative));
    }
  }

  /** Whether the node adds or subtracts. */
  public static boolean isSum(Expr node) {
    Expr inside = Trees.inside(node);
    return inside instanceof Expr.Binary binary
        && (binary.op() == BinaryOp.ADD || binary.op() == BinaryOp.SUBTRACT);
  }

  /**
   * The whole product that a node is a factor of; what a quotient is divided by is one of its own.
   */
  @SuppressWarnings("ReferenceEquality") // one very node
  static Expr product(Expr node, FormulaView view) {
    Expr top = node;
    Expr below = node;
    for (Expr up = view.parent(node); up != null; up = view.parent(up)) {
      boolean divisor =
          up instanceof Expr.Binary binary
              && binary.op() == BinaryOp.DIVIDE
              && binary.right() == below;
      if (isProduct(up) && !divisor) {
        top = up;
      } else if (!(up instanceof Expr.Paren)) {
        break;
      }
      below = up;
    }
    return top;
  }

  /** The whole sum that a node is an addend of. */
  static Expr sum(Expr node, FormulaView view) {
    Expr top = node;
    for (Expr up = node; up != null; up = view.parent(up)) {
      if (isSum(up)) {
        top = up;
      } else if (up != node && !(up instanceof Expr.Paren)) {
        break;
      }
    }
    return top;
  }
}
