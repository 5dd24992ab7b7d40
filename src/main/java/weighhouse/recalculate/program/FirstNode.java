package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;

/** Of an array its first value: a named formula used where one value is wanted. */
final class FirstNode extends Node {
  private final Node node;

  FirstNode(Node node) {
    this.node = node;
  }

  @Override
  public double number(Frame frame) {
    return node.number(frame);
  }

  @Override
  public double plain(Frame frame) {
    return node.plain(frame);
  }

  @Override
  public Value value(Frame frame) {
    return Coerce.single(node.value(frame));
  }

  @Override
  public weighhouse.recalculate.functions.Reference reference(Frame frame) {
    return node.reference(frame);
  }

  @Override
  public weighhouse.recalculate.functions.Grid grid(Frame frame) {
    return node.grid(frame);
  }
}
