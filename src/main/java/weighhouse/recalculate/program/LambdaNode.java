package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.Lambda;

/** LAMBDA: its parameters are places in the frame that a call fills. */
final class LambdaNode extends Node {
  private final int[] parameters;
  private final Node body;

  LambdaNode(int[] parameters, Node body) {
    this.parameters = parameters;
    this.body = body;
  }

  Lambda bound(Frame frame) {
    return arguments -> {
      if (arguments.size() > parameters.length) {
        throw Fault.VALUE.exception();
      }
      for (int i = 0; i < arguments.size(); i++) {
        frame.locals[parameters[i]] = new Constant(arguments.get(i));
      }
      return body.value(frame);
    };
  }

  @Override
  public Value value(Frame frame) {
    return Fault.CALC.value();
  }
}
