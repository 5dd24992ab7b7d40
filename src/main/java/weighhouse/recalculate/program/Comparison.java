package weighhouse.recalculate.program;

import java.util.function.IntPredicate;
import weighhouse.formula.BinaryOp;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Order;

/** A comparison of two values. */
final class Comparison extends Node {
  private final Node left;
  private final Node right;
  private final IntPredicate holds;

  Comparison(BinaryOp operator, Node left, Node right) {
    this.left = left;
    this.right = right;
    this.holds = holds(operator);
  }

  private static IntPredicate holds(BinaryOp operator) {
    return switch (operator) {
      case EQUAL -> order -> order == 0;
      case NOT_EQUAL -> order -> order != 0;
      case LESS -> order -> order < 0;
      case LESS_OR_EQUAL -> order -> order <= 0;
      case GREATER -> order -> order > 0;
      case GREATER_OR_EQUAL -> order -> order >= 0;
      default -> throw new IllegalArgumentException(operator.symbol());
    };
  }

  @Override
  public double number(Frame frame) {
    return compared(left.plain(frame), right.plain(frame));
  }

  private double compared(double a, double b) {
    if (Double.isNaN(a) || Double.isNaN(b)) {
      return Double.NaN;
    }
    return holds.test(Order.compare(a, b)) ? 1 : 0;
  }

  @Override
  public double plain(Frame frame) {
    return Double.NaN;
  }

  @Override
  public Value value(Frame frame) {
    return Broadcast.pairs(left.value(frame), right.value(frame), this::single);
  }

  private Value single(Value a, Value b) {
    return new Value.Logical(holds.test(Order.compare(a, b)));
  }

  @Override
  public Grid grid(Frame frame) {
    // text and truth values read as numbers would compare wrongly, so each pair is compared whole
    return PairedGrid.ofTruths(
        left.grid(frame), right.grid(frame), (a, b) -> Double.NaN, this::single);
  }
}
