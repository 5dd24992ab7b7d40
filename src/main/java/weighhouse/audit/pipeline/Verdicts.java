package weighhouse.audit.pipeline;

import java.util.List;
import weighhouse.audit.Finding;
import weighhouse.audit.Severity;
import weighhouse.audit.Verdict;

/** The whole audit in a word. */
final class Verdicts {
  private Verdicts() {}

  /** Hold with a finding above minor that nobody accepted, query with any other, else pass. */
  static Verdict of(List<Finding> findings) {
    List<Finding> open = findings.stream().filter(f -> f.acceptance() == null).toList();
    if (open.isEmpty()) {
      return Verdict.PASS;
    }
    boolean grave = open.stream().anyMatch(f -> f.severity().compareTo(Severity.MAJOR) <= 0);
    return grave ? Verdict.HOLD : Verdict.QUERY;
  }
}
