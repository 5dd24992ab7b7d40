package weighhouse.cli;

/** A command cannot do what it was asked; the message is for the user and says what to do. */
final class UnusableException extends Exception {
  private static final long serialVersionUID = 1L;

  UnusableException(String message) {
    super(message);
  }
}
