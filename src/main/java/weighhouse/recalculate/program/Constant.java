package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;

/** A literal. */
final class Constant extends Node {
  private final Value value;
  private final double number;
  private final double plain;

  Constant(Value value) {
    this.value = value;
    this.number = value.number();
    this.plain = value instanceof Value.Num n ? n.value() : Double.NaN;
  }

  @Override
  public double number(Frame frame) {
    return number;
  }

  @Override
  public double plain(Frame frame) {
    return plain;
  }

  @Override
  public Value value(Frame frame) {
    return value;
  }
}
