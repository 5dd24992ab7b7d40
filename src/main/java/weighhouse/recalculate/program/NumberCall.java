package weighhouse.recalculate.program;

import java.util.function.DoubleUnaryOperator;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.Grid;

/** A function of one number. */
final class NumberCall extends Node {
  private final DoubleUnaryOperator operator;
  private final Node argument;

  NumberCall(DoubleUnaryOperator operator, Node argument) {
    this.operator = operator;
    this.argument = argument;
  }

  @Override
  public double number(Frame frame) {
    double result = operator.applyAsDouble(argument.number(frame));
    return Math.abs(result) <= Double.MAX_VALUE ? result : Double.NaN;
  }

  @Override
  public double plain(Frame frame) {
    return number(frame);
  }

  @Override
  public Value value(Frame frame) {
    return Broadcast.each(argument.value(frame), this::single);
  }

  private Value single(Value value) {
    return Coerce.of(operator.applyAsDouble(Coerce.number(value)));
  }

  @Override
  public Grid grid(Frame frame) {
    return PairedGrid.of(
        argument.grid(frame),
        Grid.of(new Value.Num(0)),
        (a, ignored) -> operator.applyAsDouble(a),
        (a, ignored) -> single(a));
  }
}
