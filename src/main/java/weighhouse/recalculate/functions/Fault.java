package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;

/** Excel's errors, as values and as what a function throws to answer with one. */
@SuppressWarnings("ImmutableEnumChecker") // a record of a text, and an exception without state
public enum Fault {
  NULL("#NULL!", 1),
  DIV0("#DIV/0!", 2),
  VALUE("#VALUE!", 3),
  REF("#REF!", 4),
  NAME("#NAME?", 5),
  NUM("#NUM!", 6),
  NA("#N/A", 7),
  SPILL("#SPILL!", 9),
  CALC("#CALC!", 14);

  private final int number;
  private final Value.Fault value;
  private final FaultException exception;

  Fault(String code, int number) {
    this.number = number;
    this.value = new Value.Fault(code);
    this.exception = new FaultException(value);
  }

  public Value.Fault value() {
    return value;
  }

  /** To throw: one shared object without a stack trace. */
  public FaultException exception() {
    return exception;
  }

  /** The exception that carries an error value. */
  public static FaultException thrown(Value.Fault value) {
    for (Fault fault : values()) {
      if (fault.value.equals(value)) {
        return fault.exception;
      }
    }
    return new FaultException(value);
  }

  /** Number as in {@code ERROR.TYPE}: {@code #NULL!} is 1. */
  public int number() {
    return number;
  }
}
