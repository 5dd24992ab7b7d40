package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Coerce;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Reference;

/** The operator {@code @}: the cell in the host's row or column, or an array's first value. */
final class SingleNode extends Node {
  private final Node operand;

  SingleNode(Node operand) {
    this.operand = operand;
  }

  @Override
  public Value value(Frame frame) {
    try {
      Reference reference = operand.reference(frame);
      return reference == null
          ? Coerce.single(operand.value(frame))
          : ReferenceNode.intersection(reference, frame);
    } catch (FaultException e) {
      return e.value();
    }
  }
}
