package weighhouse.recalculate.program;

import java.util.function.DoubleBinaryOperator;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;

/** A function of two numbers. */
final class NumbersCall extends Node {
  private final DoubleBinaryOperator operator;
  private final Node first;
  private final Node second;

  NumbersCall(DoubleBinaryOperator operator, Node first, Node second) {
    this.operator = operator;
    this.first = first;
    this.second = second;
  }

  @Override
  public double number(Frame frame) {
    double result = operator.applyAsDouble(first.number(frame), second.number(frame));
    return Math.abs(result) <= Double.MAX_VALUE ? result : Double.NaN;
  }

  @Override
  public double plain(Frame frame) {
    return number(frame);
  }

  @Override
  public Value value(Frame frame) {
    return Broadcast.pairs(first.value(frame), second.value(frame), this::single);
  }

  private Value single(Value a, Value b) {
    return Coerce.of(operator.applyAsDouble(Coerce.number(a), Coerce.number(b)));
  }
}
