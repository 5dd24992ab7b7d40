package weighhouse.workbook;

import java.io.IOException;

/**
 * Why a file cannot be read, found where its name is not known: the message completes the sentence
 * that starts with the file's name, such as "is password-protected: ...".
 */
public final class WorkbookFault extends IOException {
  private static final long serialVersionUID = 1L;

  public WorkbookFault(String predicate) {
    super(predicate);
  }

  public WorkbookFault(String predicate, Throwable cause) {
    super(predicate, cause);
  }

  /** The fault for the user, in a file of that name. */
  public UnreadableWorkbookException in(String fileName) {
    return new UnreadableWorkbookException(fileName + " " + getMessage() + ".", this);
  }
}
