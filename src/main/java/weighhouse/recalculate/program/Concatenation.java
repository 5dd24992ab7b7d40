package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;

/** Two texts put together. */
final class Concatenation extends Node {
  private final Node left;
  private final Node right;

  Concatenation(Node left, Node right) {
    this.left = left;
    this.right = right;
  }

  @Override
  public double number(Frame frame) {
    return Double.NaN;
  }

  @Override
  public double plain(Frame frame) {
    return Double.NaN;
  }

  @Override
  public Value value(Frame frame) {
    return Broadcast.pairs(
        left.value(frame),
        right.value(frame),
        (a, b) -> new Value.Text(Coerce.text(a) + Coerce.text(b)));
  }
}
