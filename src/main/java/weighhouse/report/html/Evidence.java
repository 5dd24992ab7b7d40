package weighhouse.report.html;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.audit.Plot;

/** Plots that belong to no single finding: proportional hazards, and the draws. */
final class Evidence {
  private Evidence() {}

  static void write(AuditResult result, Element main) {
    if (hasHazards(result)) {
      Element section = Tags.section(main, "hazards", "Are the hazards proportional?");
      Tags.text(
          section,
          "p",
          "lead",
          "Under a constant hazard ratio the curves of ln(−ln S) against ln t run in parallel. "
              + "Curves that cross or drift apart speak against one ratio for all times.");
      hazards(result).forEach(plot -> PlotFigure.write(plot, section));
    }
    if (hasDraws(result)) {
      Element section = Tags.section(main, "draws", "Draws");
      Tags.text(
          section,
          "p",
          "lead",
          "The model run with the same random numbers as it is and with all corrections.");
      draws(result).forEach(plot -> PlotFigure.write(plot, section));
    }
  }

  static boolean hasHazards(AuditResult result) {
    return !hazards(result).isEmpty();
  }

  static boolean hasDraws(AuditResult result) {
    return !draws(result).isEmpty();
  }

  private static List<Plot> hazards(AuditResult result) {
    Set<String> findings = result.findings().stream().map(Finding::id).collect(Collectors.toSet());
    return result.plots().stream()
        .filter(plot -> !plot.about().equals(Plot.DRAWS) && !findings.contains(plot.about()))
        .toList();
  }

  private static List<Plot> draws(AuditResult result) {
    return result.plots().stream().filter(plot -> plot.about().equals(Plot.DRAWS)).toList();
  }
}
