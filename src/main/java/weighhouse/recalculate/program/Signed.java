package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.Grid;

/** Minus or percent: a number times a constant. */
final class Signed extends Node {
  private final Node operand;
  private final double divisor;

  private Signed(Node operand, double divisor) {
    this.operand = operand;
    this.divisor = divisor;
  }

  static Node minus(Node operand) {
    return new Signed(operand, -1);
  }

  static Node percent(Node operand) {
    return new Signed(operand, 100);
  }

  @Override
  public double number(Frame frame) {
    // 0 divided by -1 would be a negative zero
    return operand.number(frame) / divisor + 0.0;
  }

  @Override
  public double plain(Frame frame) {
    return number(frame);
  }

  @Override
  public Value value(Frame frame) {
    return Broadcast.each(operand.value(frame), this::single);
  }

  private Value single(Value value) {
    return Coerce.of(Coerce.number(value) / divisor + 0.0);
  }

  @Override
  public Grid grid(Frame frame) {
    return PairedGrid.of(
        operand.grid(frame),
        Grid.of(new Value.Num(0)),
        (a, ignored) -> a / divisor + 0.0,
        (a, ignored) -> single(a));
  }
}
