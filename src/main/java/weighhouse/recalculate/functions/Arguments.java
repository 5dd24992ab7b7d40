package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;

/** What a function is called with. Evaluated when asked for, so that a function may be lazy. */
public interface Arguments {
  int count();

  /** Whether the argument was left empty or is beyond the last. */
  boolean missing(int index);

  /** The argument as one value (or an array, where the function takes arrays). */
  Value value(int index);

  /** The argument as a rectangle; an error as a rectangle of one. */
  Grid grid(int index);

  /** What the argument points at, or null where it is no reference. */
  Reference reference(int index);

  /** The function given as an argument; {@code #VALUE!} where it is none. */
  Lambda lambda(int index);

  Surroundings surroundings();

  /** The argument as a number; text that looks like one counts. */
  default double number(int index) {
    return Coerce.number(value(index));
  }

  default double number(int index, double otherwise) {
    return missing(index) ? otherwise : number(index);
  }

  /** The argument as a whole number, rounded towards zero as most functions do. */
  default int integer(int index) {
    double number = Math.floor(number(index));
    if (Math.abs(number) > Integer.MAX_VALUE) {
      throw Fault.NUM.exception();
    }
    return (int) number;
  }

  default int integer(int index, int otherwise) {
    return missing(index) ? otherwise : integer(index);
  }

  default String text(int index) {
    return Coerce.text(value(index));
  }

  default boolean logical(int index) {
    return Coerce.logical(value(index));
  }

  default boolean logical(int index, boolean otherwise) {
    return missing(index) ? otherwise : logical(index);
  }

  /** Whether ranges and arrays stand here, whose text and truth values most functions skip. */
  default boolean isRange(int index) {
    return reference(index) != null || value(index) instanceof Value.Array;
  }
}
