package weighhouse.rules.pattern;

import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;

/** How the number a metavariable stands for follows from the term in the formula. */
public enum Wrapping {
  /** The term itself. */
  NONE {
    @Override
    double term(double value) {
      return value;
    }

    @Override
    Expr operand(Expr term) {
      return term;
    }
  },
  /** One minus the term, as a ratio is one minus a reduction. */
  COMPLEMENT {
    @Override
    double term(double value) {
      return 1 - value;
    }

    @Override
    Expr operand(Expr term) {
      return new Expr.Binary(BinaryOp.SUBTRACT, ONE, term);
    }
  },
  /** The exponential of the term, as a ratio is of its logarithm. */
  EXPONENTIAL {
    @Override
    double term(double value) {
      return Math.log(value);
    }

    @Override
    Expr operand(Expr term) {
      return new Expr.Call("EXP", List.of(term));
    }
  };

  private static final Expr ONE = new Expr.Num(1, "1");

  /** The term's number where the metavariable has the value. */
  abstract double term(double value);

  /** The metavariable as an expression of the term's. */
  abstract Expr operand(Expr term);
}
