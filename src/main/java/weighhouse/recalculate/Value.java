package weighhouse.recalculate;

/** The value of a cell or of a part of a formula. */
public sealed interface Value {
  record Num(double value) implements Value {}

  record Text(String value) implements Value {}

  record Logical(boolean value) implements Value {}

  /** An error, by its code: {@code #DIV/0!}. */
  record Fault(String code) implements Value {}

  record Blank() implements Value {}

  /** A rectangle of values, rows first; none of them an array. */
  @SuppressWarnings("ArrayRecordComponent") // compared nowhere; a list would double the memory
  record Array(Value[][] rows) implements Value {}

  /** The number that arithmetic sees: blank 0, TRUE 1; NaN for text, errors and arrays. */
  default double number() {
    if (this instanceof Num n) {
      return n.value();
    }
    if (this instanceof Logical l) {
      return l.value() ? 1 : 0;
    }
    return this instanceof Blank ? 0 : Double.NaN;
  }
}
