package weighhouse.report.exchange;

import java.util.Comparator;
import weighhouse.audit.CellFigures;
import weighhouse.audit.Finding;

/** The cell of a finding whose value is furthest from correct. */
final class Worst {
  private Worst() {}

  /** Null where the finding has no values. */
  static CellFigures of(Finding finding) {
    return finding.values().stream().max(Comparator.comparingDouble(Worst::distance)).orElse(null);
  }

  private static double distance(CellFigures figures) {
    double distance = Math.abs(figures.now().number() - figures.correct().number());
    return Double.isNaN(distance) ? Double.MAX_VALUE : distance;
  }
}
