package weighhouse.recalculate.program;

/** A formula that cannot be run; the message is the reason, such as a function's name. */
public final class UnsupportedFormulaException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  public UnsupportedFormulaException(String reason) {
    super(reason, null, false, false);
  }
}
