package weighhouse.quantity.algebra;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;

/** Takes sums and products apart, through parentheses, signs and the functions for them. */
final class Parts {
  private Parts() {}

  /** The terms of a sum or difference, signs left out. */
  static List<Expr> terms(Expr node) {
    List<Expr> terms = new ArrayList<>();
    collectTerms(node, terms);
    return terms;
  }

  private static void collectTerms(Expr node, List<Expr> terms) {
    Expr inner = unsigned(node);
    if (inner instanceof Expr.Binary sum
        && (sum.op() == BinaryOp.ADD || sum.op() == BinaryOp.SUBTRACT)) {
      collectTerms(sum.left(), terms);
      collectTerms(sum.right(), terms);
    } else if (inner instanceof Expr.Call call && call.function().equals("SUM")) {
      call.arguments().forEach(argument -> collectTerms(argument, terms));
    } else {
      terms.add(inner);
    }
  }

  /** The factors of a product; divisors too, because they stand for 1/x. */
  static List<Expr> factors(Expr node) {
    List<Expr> factors = new ArrayList<>();
    collectFactors(node, factors);
    return factors;
  }

  private static void collectFactors(Expr node, List<Expr> factors) {
    Expr inner = unsigned(node);
    if (inner instanceof Expr.Binary product
        && (product.op() == BinaryOp.MULTIPLY || product.op() == BinaryOp.DIVIDE)) {
      collectFactors(product.left(), factors);
      collectFactors(product.right(), factors);
    } else if (inner instanceof Expr.Call call
        && (call.function().equals("PRODUCT") || call.function().equals("SUMPRODUCT"))) {
      call.arguments().forEach(argument -> collectFactors(argument, factors));
    } else {
      factors.add(inner);
    }
  }

  /** The node without signs and parentheses around it. */
  static Expr unsigned(Expr node) {
    Expr inner = Trees.inside(node);
    while (inner instanceof Expr.Unary unary && unary.op() != UnaryOp.PERCENT) {
      inner = Trees.inside(unary.operand());
    }
    return inner;
  }

  /**
   * What is subtracted from 1, in {@code 1-x} or {@code 1-x-y}; null if the node is nothing such.
   */
  static List<Expr> takenFromOne(Expr node) {
    Expr inner = Trees.inside(node);
    if (!(inner instanceof Expr.Binary difference) || difference.op() != BinaryOp.SUBTRACT) {
      return null;
    }
    List<Expr> terms = terms(inner);
    boolean fromOne = terms.get(0) instanceof Expr.Num one && one.value() == 1;
    return fromOne ? terms.subList(1, terms.size()) : null;
  }

  /** The base and exponent of a power, written either way; null if the node is none. */
  static List<Expr> power(Expr node) {
    Expr inner = Trees.inside(node);
    if (inner instanceof Expr.Binary power && power.op() == BinaryOp.POWER) {
      return List.of(power.left(), power.right());
    }
    boolean call =
        inner instanceof Expr.Call c && c.function().equals("POWER") && c.arguments().size() == 2;
    return call ? Trees.children(inner) : null;
  }

  /** The argument of a function of one argument; null if the node is no call of it. */
  static Expr argument(Expr node, String function) {
    return unsigned(node) instanceof Expr.Call call
            && call.function().equals(function)
            && call.arguments().size() == 1
        ? call.arguments().get(0)
        : null;
  }
}
