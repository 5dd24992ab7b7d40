package weighhouse.recalculate.functions;

import java.util.function.IntPredicate;
import java.util.function.Predicate;
import java.util.regex.Pattern;
import weighhouse.recalculate.Value;

/**
 * The condition of COUNTIF and its kin: a value to equal, or a text such as {@code >=5}, {@code
 * <>x}, {@code a*}.
 */
final class Criterion implements Predicate<Value> {
  private final Predicate<Value> test;

  private Criterion(Predicate<Value> test) {
    this.test = test;
  }

  @Override
  public boolean test(Value value) {
    return test.test(value);
  }

  static Criterion of(Value value) {
    if (value instanceof Value.Text text) {
      return ofText(text.value());
    }
    if (value instanceof Value.Blank) {
      return new Criterion(equalTo(new Value.Num(0)));
    }
    return new Criterion(equalTo(value));
  }

  private static Criterion ofText(String text) {
    for (String operator : new String[] {">=", "<=", "<>", ">", "<", "="}) {
      if (text.startsWith(operator)) {
        return new Criterion(compared(operator, text.substring(operator.length())));
      }
    }
    return new Criterion(text.isEmpty() ? Criterion::empty : equalTo(operand(text)));
  }

  private static Predicate<Value> compared(String operator, String rest) {
    Predicate<Value> blank = v -> v instanceof Value.Blank;
    return switch (operator) {
      case "=" -> rest.isEmpty() ? blank : equalTo(operand(rest));
      case "<>" -> rest.isEmpty() ? blank.negate() : equalTo(operand(rest)).negate();
      default -> ordered(operand(rest), sign(operator));
    };
  }

  private static IntPredicate sign(String operator) {
    return switch (operator) {
      case ">" -> c -> c > 0;
      case ">=" -> c -> c >= 0;
      case "<" -> c -> c < 0;
      default -> c -> c <= 0;
    };
  }

  private static Predicate<Value> ordered(Value operand, IntPredicate sign) {
    return v -> v.getClass() == operand.getClass() && sign.test(Order.compare(v, operand));
  }

  private static Value operand(String text) {
    if (text.equalsIgnoreCase("TRUE") || text.equalsIgnoreCase("FALSE")) {
      return new Value.Logical(text.equalsIgnoreCase("TRUE"));
    }
    for (Fault fault : Fault.values()) {
      if (fault.value().code().equalsIgnoreCase(text)) {
        return fault.value();
      }
    }
    double number = NumberText.parse(text);
    return Double.isNaN(number) ? new Value.Text(text) : new Value.Num(number);
  }

  private static boolean empty(Value value) {
    return value instanceof Value.Blank || (value instanceof Value.Text t && t.value().isEmpty());
  }

  private static Predicate<Value> equalTo(Value operand) {
    if (operand instanceof Value.Text text) {
      return equalTo(text.value());
    }
    if (operand instanceof Value.Num number) {
      return v -> equals(v, number.value());
    }
    return operand::equals;
  }

  private static Predicate<Value> equalTo(String text) {
    if (Wildcard.has(text)) {
      Pattern pattern = Wildcard.pattern(text);
      return v -> v instanceof Value.Text t && pattern.matcher(t.value()).matches();
    }
    return v -> v instanceof Value.Text t && t.value().equalsIgnoreCase(text);
  }

  private static boolean equals(Value value, double number) {
    if (value instanceof Value.Num n) {
      return Order.compare(n.value(), number) == 0;
    }
    return value instanceof Value.Text t && NumberText.parse(t.value()) == number;
  }
}
