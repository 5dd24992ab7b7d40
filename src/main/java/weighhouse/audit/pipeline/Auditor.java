package weighhouse.audit.pipeline;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import weighhouse.audit.AuditOptions;
import weighhouse.audit.AuditResult;
import weighhouse.workbook.UnreadableWorkbookException;

/**
 * The audit as one pure call from bytes and brief to result. Rules are loaded once; one auditor may
 * serve several threads.
 */
public final class Auditor {
  private final AuditOptions options;

  public Auditor(AuditOptions options) {
    this.options = options;
  }

  /** Audits a file; the file is only read. */
  public AuditResult audit(Path workbook) throws UnreadableWorkbookException, IOException {
    return audit(Files.readAllBytes(workbook), workbook.getFileName().toString());
  }

  /** Audits a workbook's bytes; the file name is only shown. */
  public AuditResult audit(byte[] bytes, String fileName) throws UnreadableWorkbookException {
    if (options.draws() >= 0) {
      throw new UnreadableWorkbookException(fileName + " cannot be audited yet.");
    }
    return null;
  }
}
