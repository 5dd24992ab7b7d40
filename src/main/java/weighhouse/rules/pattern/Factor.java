package weighhouse.rules.pattern;

import weighhouse.formula.Expr;

/** One factor of a product as written; an inverse one divides. */
public record Factor(Expr node, boolean inverse) {
  /** What a sign in front of a product is a factor of. */
  static final Expr SIGN = new Expr.Num(-1, "-1");

  /** Whether it is the sign in front of a product. */
  @SuppressWarnings("ReferenceEquality") // a number -1 that someone wrote is not the sign
  public boolean isSign() {
    return node == SIGN;
  }
}
