package weighhouse.formula;

/** A formula that Excel's grammar does not allow; says what is wrong and where. */
public class FormulaSyntaxException extends Exception {
  private static final long serialVersionUID = 1L;

  private final int position;

  /**
   * @param message what is wrong
   * @param position zero-based character in the formula's text
   */
  public FormulaSyntaxException(String message, int position) {
    super(message);
    this.position = position;
  }

  public int position() {
    return position;
  }
}
