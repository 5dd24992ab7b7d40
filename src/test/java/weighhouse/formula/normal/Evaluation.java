package weighhouse.formula.normal;

import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.UnaryOp;

/** Values of trees and of normal forms at given values of their names. */
final class Evaluation {
  private Evaluation() {}

  static double of(Expr node, Map<String, Double> values) {
    if (node instanceof Expr.Num number) {
      return number.value();
    } else if (node instanceof Expr.NameRef name) {
      return values.get(name.name());
    } else if (node instanceof Expr.Paren paren) {
      return of(paren.inner(), values);
    } else if (node instanceof Expr.Unary unary) {
      double x = of(unary.operand(), values);
      return unary.op() == UnaryOp.MINUS ? -x : unary.op() == UnaryOp.PERCENT ? x / 100 : x;
    } else if (node instanceof Expr.Call call) {
      double x = of(call.arguments().get(0), values);
      return function(call.function(), x);
    }
    Expr.Binary binary = (Expr.Binary) node;
    double x = of(binary.left(), values);
    double y = of(binary.right(), values);
    return switch (binary.op()) {
      case ADD -> x + y;
      case SUBTRACT -> x - y;
      case MULTIPLY -> x * y;
      case DIVIDE -> x / y;
      case POWER -> Math.pow(x, y);
      default -> throw new IllegalArgumentException(binary.op().name());
    };
  }

  static double of(Poly poly, Map<String, Double> values) {
    double sum = 0;
    for (Term term : poly.terms()) {
      double product = term.coefficient().value();
      for (Map.Entry<Atom, Poly> factor : term.factors().entrySet()) {
        product *= Math.pow(of(factor.getKey(), values), of(factor.getValue(), values));
      }
      sum += product;
    }
    return sum;
  }

  private static double of(Atom atom, Map<String, Double> values) {
    if (atom instanceof Atom.Name name) {
      return values.get(name.name());
    } else if (atom instanceof Atom.Euler) {
      return Math.E;
    } else if (atom instanceof Atom.Constant constant) {
      return constant.value().value();
    } else if (atom instanceof Atom.Sum sum) {
      return of(sum.sum(), values);
    }
    Atom.Function function = (Atom.Function) atom;
    return function(function.name(), of(function.arguments().get(0), values));
  }

  private static double function(String name, double x) {
    return switch (name) {
      case "EXP" -> Math.exp(x);
      case "LN" -> Math.log(x);
      case "SQRT" -> Math.sqrt(x);
      default -> throw new IllegalArgumentException(name);
    };
  }
}
