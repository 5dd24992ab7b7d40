package weighhouse.generator.score;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Predicate;
import weighhouse.generator.CaseRecord;
import weighhouse.generator.Manifest;
import weighhouse.generator.Ranges;
import weighhouse.generator.SeededFault;
import weighhouse.generator.score.AuditFile.Finding;

/**
 * Scores audits. A finding matches a seeded fault when its rule names it and its cells overlap the
 * root; every other finding above {@code query} is a false alarm, also one on cells that only copy
 * the root. Twins and look-alikes hold no fault.
 */
public final class Scorer {
  private static final double TOLERANCE = 1e-6;

  private final Path audits;
  private final Score score = new Score();

  private Scorer(Path audits) {
    this.audits = audits;
  }

  /** Scores the cases of a manifest that a filter takes; audits lie in one folder. */
  public static Score score(Manifest manifest, Path audits, Predicate<CaseRecord> taken)
      throws IOException {
    Scorer scorer = new Scorer(audits);
    for (CaseRecord one : manifest.cases()) {
      if (taken.test(one)) {
        scorer.add(one, one.file(), one.faults());
        if (one.twin() != null) {
          scorer.add(one, one.twin(), List.of());
        }
      }
    }
    return scorer.score;
  }

  private void add(CaseRecord one, String file, List<SeededFault> faults) throws IOException {
    AuditFile audit = AuditFile.of(audits, file);
    if (audit == null) {
      score.notAudited().add(file);
      return;
    }
    for (SeededFault fault : faults) {
      fault(one, file, fault, audit);
    }
    for (Finding finding : audit.findings()) {
      finding(one, file, finding, faults);
    }
  }

  private void fault(CaseRecord one, String file, SeededFault fault, AuditFile audit) {
    List<Finding> matching =
        audit.findings().stream().filter(finding -> matches(finding, fault)).toList();
    List<Tally> tallies = score.tallies(fault.rule(), one.layout());
    tallies.forEach(tally -> tally.seeded(!matching.isEmpty()));
    if (matching.isEmpty()) {
      score
          .misses()
          .add(
              "%s %s %s %s [%s]"
                  .formatted(file, fault.rule(), fault.cells(), fault.formula(), fault.note()));
    }
    for (SeededFault.CellValue expected : fault.expected()) {
      for (Finding finding : matching) {
        Double correct = finding.correct().get(expected.cell());
        if (correct != null) {
          boolean right = agrees(correct, expected.value());
          tallies.forEach(tally -> tally.value(right));
        }
      }
    }
  }

  private void finding(CaseRecord one, String file, Finding finding, List<SeededFault> faults) {
    boolean matches = faults.stream().anyMatch(fault -> matches(finding, fault));
    if (matches || finding.aboveQuery()) {
      score.tallies(finding.rule(), one.layout()).forEach(tally -> tally.finding(matches));
    }
    if (!matches && finding.aboveQuery()) {
      String near =
          faults.stream()
              .filter(fault -> overlaps(finding, fault))
              .map(fault -> "; seeded there: " + fault.rule())
              .findFirst()
              .orElse("");
      score
          .falseAlarms()
          .add(
              "%s %s (%s) %s %s%s"
                  .formatted(
                      file,
                      finding.rule(),
                      finding.severity(),
                      finding.cells(),
                      finding.formula(),
                      near));
    }
  }

  private static boolean matches(Finding finding, SeededFault fault) {
    return RuleList.names(finding.rule(), fault.rule()) && overlaps(finding, fault);
  }

  private static boolean overlaps(Finding finding, SeededFault fault) {
    return finding.cells().stream()
        .anyMatch(cell -> fault.cells().stream().anyMatch(root -> Ranges.overlap(cell, root)));
  }

  private static boolean agrees(double one, double other) {
    return Math.abs(one - other) <= TOLERANCE * Math.max(1e-9, Math.abs(other));
  }
}
