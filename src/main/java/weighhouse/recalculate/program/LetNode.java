package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Reference;

/** LET: evaluates each name once, then the result. */
final class LetNode extends Node {
  private final int[] places;
  private final Node[] definitions;
  private final Node result;

  LetNode(int[] places, Node[] definitions, Node result) {
    this.places = places;
    this.definitions = definitions;
    this.result = result;
  }

  private void define(Frame frame) {
    for (int i = 0; i < places.length; i++) {
      Node definition = definitions[i];
      boolean asIs = definition instanceof LambdaNode || definition.reference(frame) != null;
      frame.locals[places[i]] = asIs ? definition : new Constant(definition.value(frame));
    }
  }

  @Override
  public Value value(Frame frame) {
    define(frame);
    return result.value(frame);
  }

  @Override
  public Reference reference(Frame frame) {
    define(frame);
    return result.reference(frame);
  }
}
