package weighhouse.recalculate.program;

import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.recalculate.Value;

/**
 * A sum or difference that ends a formula: where nearly all digits cancel, Excel leaves 0 (see
 * "IEEE 754" in its documentation of floating-point results; the limit is common knowledge, not
 * published).
 */
final class Rounded extends Node {
  private static final double CANCELLED = 0x1p-50;

  private final Node left;
  private final Node right;
  private final double sign;
  private final Node whole;

  private Rounded(Node left, Node right, double sign, Node whole) {
    this.left = left;
    this.right = right;
    this.sign = sign;
    this.whole = whole;
  }

  static Node of(Expr tree, Node root) {
    boolean sum =
        tree instanceof Expr.Binary binary
            && (binary.op() == BinaryOp.ADD || binary.op() == BinaryOp.SUBTRACT);
    if (!sum || !(root instanceof Arithmetic arithmetic)) {
      return root;
    }
    double sign = root instanceof Arithmetic.Add ? 1 : -1;
    return new Rounded(arithmetic.left, arithmetic.right, sign, root);
  }

  @Override
  public double number(Frame frame) {
    double a = left.number(frame);
    double sum = a + sign * right.number(frame);
    return Math.abs(sum) <= Math.abs(a) * CANCELLED ? 0 : sum;
  }

  @Override
  public double plain(Frame frame) {
    return number(frame);
  }

  @Override
  public Value value(Frame frame) {
    return whole.value(frame);
  }
}
