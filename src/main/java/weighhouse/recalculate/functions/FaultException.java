package weighhouse.recalculate.functions;

import weighhouse.recalculate.Value;

/** A function's answer is an error. Carries no stack trace, so it is cheap to throw. */
public final class FaultException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Value.Fault value;

  FaultException(Value.Fault value) {
    super(value.code(), null, false, false);
    this.value = value;
  }

  public Value.Fault value() {
    return value;
  }
}
