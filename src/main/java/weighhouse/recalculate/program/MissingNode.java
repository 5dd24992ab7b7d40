package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;

/** An argument left empty. */
final class MissingNode extends Node {
  @Override
  public double number(Frame frame) {
    return 0;
  }

  @Override
  public double plain(Frame frame) {
    return 0;
  }

  @Override
  public Value value(Frame frame) {
    return new Value.Blank();
  }
}
