package weighhouse.audit.pipeline;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import weighhouse.audit.AuditOptions;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.audit.Severity;
import weighhouse.audit.Verdict;
import weighhouse.workbook.CellRange;

/** The demo workbooks: every seeded fault at its root with the right formula, nothing else. */
class DemoWorkbooksTest {
  private static final Auditor AUDITOR = new Auditor(AuditOptions.DEFAULT);

  private static AuditResult audit(String name) throws Exception {
    return AUDITOR.audit(Path.of("demo-workbooks", name));
  }

  @ParameterizedTest(name = "{1} in {0}")
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          cohort-faulty.xlsx | hazard-ratio-times-probability   | Parameters!C3
          cohort-faulty.xlsx | rate-used-as-probability         | Parameters!B4
          cohort-faulty.xlsx | probability-divided-by-cycles    | Parameters!B6
          cohort-faulty.xlsx | odds-ratio-times-probability     | Parameters!C9
          cohort-faulty.xlsx | risk-ratio-over-wrong-horizon    | Parameters!C12
          cohort-faulty.xlsx | probability-converted-as-rate    | Parameters!B13
          cohort-faulty.xlsx | ratio-inverted                   | Parameters!C16
          cohort-faulty.xlsx | mortality-ratio-times-probability | 'Trace Treatment A'!F6:F65
          partitioned-survival.xlsx | hazard-ratio-on-accelerated-scale | Parameters!C2
          partitioned-survival.xlsx | hazard-ratio-times-survival | 'Trace Treatment A'!F5:F69
          """)
  void findsTheSeededFault(String workbook, String rule, String cells) throws Exception {
    AuditResult result = audit(workbook);
    List<Finding> found =
        result.findings().stream().filter(f -> f.rule().id().equals(rule)).toList();
    assertTrue(
        found.stream().anyMatch(f -> names(result, f).contains(cells)),
        () -> rule + " found at " + found.stream().map(f -> names(result, f)).toList());
  }

  private static Set<String> names(AuditResult result, Finding finding) {
    return finding.cells().stream()
        .map((CellRange range) -> result.workbook().show(range))
        .collect(Collectors.toSet());
  }

  @Test
  void leavesTheRightModelAlone() throws Exception {
    AuditResult result = audit("cohort-right.xlsx");
    List<String> above =
        result.findings().stream()
            .filter(f -> f.severity() != Severity.QUERY)
            .map(f -> f.rule().id() + " " + names(result, f))
            .toList();
    assertEquals(List.of(), above);
    assertTrue(result.verdict() != Verdict.HOLD);
  }
}
