package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Reference;

/** A name given by LET or LAMBDA. */
final class LocalNode extends ReferenceNode {
  private final int place;

  LocalNode(int place, boolean array) {
    super(array);
    this.place = place;
  }

  private Node definition(Frame frame) {
    return (Node) frame.locals[place];
  }

  @Override
  public Reference reference(Frame frame) {
    return definition(frame).reference(frame);
  }

  @Override
  Value otherwise(Frame frame) {
    return definition(frame).value(frame);
  }
}
