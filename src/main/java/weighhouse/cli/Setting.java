package weighhouse.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.function.Function;
import weighhouse.audit.AuditOptions;
import weighhouse.audit.AuditResult;
import weighhouse.audit.pipeline.Auditor;
import weighhouse.workbook.UnreadableWorkbookException;

/**
 * What commands run in.
 *
 * @param console where they write to people
 * @param audits makes the audit that they call
 */
record Setting(Console console, Function<AuditOptions, Audits> audits) {
  /** An audit of a file. */
  @FunctionalInterface
  interface Audits {
    AuditResult audit(Path workbook) throws UnreadableWorkbookException, IOException;
  }

  /** The process's terminal and the real audit. */
  static Setting system() {
    return new Setting(Console.system(), options -> new Auditor(options)::audit);
  }
}
