package weighhouse.report;

import java.util.EnumMap;
import java.util.Map;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Severity;
import weighhouse.audit.Verdict;

/**
 * A workbook in the list of several.
 *
 * @param name name of its reports
 * @param verdict null where it could not be audited
 * @param findings number of findings that are not accepted, by severity
 * @param decisionFlips whether its corrections change the decision
 * @param reports file names of its reports by format
 * @param problem why it could not be audited, or null
 */
public record IndexEntry(
    String name,
    Verdict verdict,
    Map<Severity, Integer> findings,
    boolean decisionFlips,
    Map<String, String> reports,
    String problem) {

  /** The entry of an audit. */
  public static IndexEntry of(String name, AuditResult result, Map<String, String> reports) {
    Map<Severity, Integer> findings = new EnumMap<>(Severity.class);
    for (Severity severity : Severity.values()) {
      findings.put(severity, 0);
    }
    result.findings().stream()
        .filter(finding -> finding.acceptance() == null)
        .forEach(finding -> findings.merge(finding.severity(), 1, Integer::sum));
    return new IndexEntry(name, result.verdict(), findings, result.decisionFlips(), reports, null);
  }

  /** The entry of a file that could not be audited. */
  public static IndexEntry failed(String name, String problem) {
    return new IndexEntry(name, null, Map.of(), false, Map.of(), problem);
  }
}
