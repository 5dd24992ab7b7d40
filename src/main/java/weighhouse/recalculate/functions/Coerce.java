package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;

/** One kind of value taken for another, as Excel's operators and functions do. */
public final class Coerce {
  private Coerce() {}

  /** The number: blank is 0, TRUE 1, text if it reads as a number, else {@code #VALUE!}. */
  public static double number(Value value) {
    if (value instanceof Value.Num n) {
      return n.value();
    }
    if (value instanceof Value.Text text) {
      double number = NumberText.parse(text.value());
      if (Double.isNaN(number)) {
        throw Fault.VALUE.exception();
      }
      return number;
    }
    return numberOfOthers(value);
  }

  private static double numberOfOthers(Value value) {
    if (value instanceof Value.Fault fault) {
      throw Fault.thrown(fault);
    }
    if (value instanceof Value.Array array) {
      return number(first(array));
    }
    return value.number();
  }

  public static String text(Value value) {
    if (value instanceof Value.Text text) {
      return text.value();
    }
    if (value instanceof Value.Num n) {
      return NumberText.general(n.value());
    }
    if (value instanceof Value.Logical logical) {
      return logical.value() ? "TRUE" : "FALSE";
    }
    if (value instanceof Value.Fault fault) {
      throw Fault.thrown(fault);
    }
    return value instanceof Value.Array array ? text(first(array)) : "";
  }

  /** The truth value: numbers other than 0, and the words TRUE and FALSE. */
  public static boolean logical(Value value) {
    if (value instanceof Value.Logical logical) {
      return logical.value();
    }
    if (value instanceof Value.Text text) {
      if (text.value().equalsIgnoreCase("TRUE")) {
        return true;
      }
      if (text.value().equalsIgnoreCase("FALSE")) {
        return false;
      }
      throw Fault.VALUE.exception();
    }
    return numberOfOthers(value instanceof Value.Num n ? n : value) != 0;
  }

  /** The value itself, unless it is an error. */
  public static Value sound(Value value) {
    if (value instanceof Value.Fault fault) {
      throw Fault.thrown(fault);
    }
    return value;
  }

  /** A number as a value; {@code #NUM!} where it is none. */
  public static Value of(double number) {
    return Math.abs(number) <= Double.MAX_VALUE ? new Value.Num(number) : Fault.NUM.value();
  }

  /** The upper left value of an array, any other value as it is. */
  public static Value single(Value value) {
    return value instanceof Value.Array array ? first(array) : value;
  }

  private static Value first(Value.Array array) {
    Value[][] rows = array.rows();
    return rows.length == 0 || rows[0].length == 0 ? Fault.CALC.value() : rows[0][0];
  }
}
