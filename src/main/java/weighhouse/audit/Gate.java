package weighhouse.audit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Whether a workbook may pass: what its findings and its coverage come to under a brief's demands.
 *
 * @param holding findings that hold it: as grave as demanded, and not accepted
 * @param shortfalls sentences on coverage or reproduction below the demand
 */
public record Gate(List<Finding> holding, List<String> shortfalls) {
  /** Weighs an audit. */
  public static Gate of(AuditResult result, Brief.Demands demands) {
    List<Finding> holding =
        result.findings().stream()
            .filter(finding -> finding.acceptance() == null)
            .filter(finding -> finding.severity().compareTo(demands.holdAt()) <= 0)
            .toList();
    return new Gate(holding, shortfalls(result.coverage(), demands));
  }

  /** Whether less was analysed than demanded; then a pass would say nothing. */
  public boolean incomplete() {
    return !shortfalls.isEmpty();
  }

  /** Whether findings hold the workbook. */
  public boolean held() {
    return !holding.isEmpty();
  }

  private static List<String> shortfalls(Coverage coverage, Brief.Demands demands) {
    List<String> shortfalls = new ArrayList<>();
    double covered = share(coverage.recalculated(), coverage.formulaCells());
    if (covered < demands.leastCoverage()) {
      shortfalls.add(sentence(covered, "recalculated", demands.leastCoverage()));
    }
    double reproduced = share(coverage.reproduced(), coverage.recalculated());
    if (reproduced < demands.leastReproduction()) {
      shortfalls.add(sentence(reproduced, "reproduced", demands.leastReproduction()));
    }
    return shortfalls;
  }

  private static double share(int part, int whole) {
    return whole == 0 ? 1 : (double) part / whole;
  }

  private static String sentence(double share, String what, double least) {
    return String.format(
        Locale.ROOT,
        "Only %.1f %% of the formula cells were %s; the brief demands %.1f %%.",
        Math.floor(1000 * share) / 10,
        what,
        100 * least);
  }
}
