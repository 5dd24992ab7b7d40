package weighhouse.report;

import java.io.IOException;
import java.io.OutputStream;
import weighhouse.audit.AuditResult;

/** Writes an audit in one format. Writers hold no state. */
public interface ReportWriter {
  /** Writes the whole report; the stream stays open. */
  void write(AuditResult result, OutputStream out) throws IOException;
}
