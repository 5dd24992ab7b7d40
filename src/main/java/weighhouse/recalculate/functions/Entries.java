package weighhouse.recalculate.functions;

import java.util.HashMap;
import java.util.Map;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;

/** The table while topics enter their functions; a name may be entered once only. */
final class Entries {
  private final Map<String, Function> byName = new HashMap<>();

  void number(String name, DoubleUnaryOperator operator) {
    enter(name, new Function.OfNumber(operator));
  }

  void numbers(String name, DoubleBinaryOperator operator) {
    enter(name, new Function.OfNumbers(operator));
  }

  void fold(Fold fold) {
    enter(fold.name(), new Function.Folding(fold));
  }

  void general(String name, String signature, Function.Body body) {
    enter(name, new Function.General(Signature.of(signature), body));
  }

  void selecting(String name, String signature, Function.Selector selector) {
    enter(name, new Function.Selecting(Signature.of(signature), selector));
  }

  void locating(String name, String signature, Function.Locator locator, Function.Body body) {
    enter(name, new Function.Locating(Signature.of(signature), locator, body, false));
  }

  /** One that may point anywhere, so that what it reads is known only when it runs. */
  void pointing(String name, String signature, Function.Locator locator) {
    Function.Body none = a -> Fault.REF.value();
    enter(name, new Function.Locating(Signature.of(signature), locator, none, true));
  }

  void drawing(String name, String signature, Function.Body body) {
    enter(name, new Function.Drawing(Signature.of(signature), body));
  }

  /** Other names of a function that is in the table already. */
  void alias(String name, String... others) {
    for (String other : others) {
      enter(other, byName.get(name));
    }
  }

  private void enter(String name, Function function) {
    if (function == null || byName.put(name, function) != null) {
      throw new IllegalStateException(name + " is entered twice, or is another's unknown name");
    }
  }

  Map<String, Function> all() {
    return Map.copyOf(byName);
  }
}
