package weighhouse.workbook;

/** The file cannot be audited; the message is one sentence that says why and what to do. */
public class UnreadableWorkbookException extends Exception {
  private static final long serialVersionUID = 1L;

  public UnreadableWorkbookException(String message) {
    super(message);
  }

  public UnreadableWorkbookException(String message, Throwable cause) {
    super(message, cause);
  }
}
