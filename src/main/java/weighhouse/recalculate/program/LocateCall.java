package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Function;
import weighhouse.recalculate.functions.Reference;

/** INDEX, OFFSET and the like: a reference where there is one. */
final class LocateCall extends ReferenceNode {
  private final Function.Locator locator;
  private final GeneralCall fallback;
  private final Node[] arguments;
  private final boolean lifts;

  LocateCall(Function.Locating function, Node[] arguments, boolean array) {
    super(array);
    this.locator = function.locator();
    this.fallback = new GeneralCall(function.body(), function.signature(), arguments);
    this.arguments = arguments;
    this.lifts = array;
  }

  @Override
  public Reference reference(Frame frame) {
    Value[] values = new Value[arguments.length];
    if (lifts) {
      for (int i = 1; i < values.length; i++) {
        if (arguments[i].value(frame) instanceof Value.Array) {
          return null;
        }
      }
    }
    return locator.locate(new CallArguments(frame, arguments, values));
  }

  @Override
  Value otherwise(Frame frame) {
    try {
      return fallback.value(frame);
    } catch (FaultException e) {
      return e.value();
    }
  }
}
