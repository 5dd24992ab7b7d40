package weighhouse.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.audit.OutcomeFigures;
import weighhouse.audit.Severity;
import weighhouse.audit.Verdict;
import weighhouse.report.text.Numbers;
import weighhouse.report.text.Visible;

/** An audit in a few lines for a terminal. */
final class Summary {
  private static final int MOST_FINDINGS = 12;
  private static final int MOST_OUTCOMES = 4;
  private static final int MOST_LABEL = 40;

  private final AuditResult result;
  private final Console console;
  private final List<String> lines = new ArrayList<>();

  Summary(AuditResult result, Console console) {
    this.result = result;
    this.console = console;
  }

  List<String> lines(Path folder, Collection<String> reports) {
    verdict();
    outcomes();
    findings();
    lines.add("");
    for (String report : reports) {
      lines.add("Report: " + Visible.text(folder.resolve(report).toString()));
    }
    lines.add("Findings need a qualified reviewer; the agency's own guidance rules.");
    return lines;
  }

  private void verdict() {
    long open = result.findings().stream().filter(f -> f.acceptance() == null).count();
    long accepted = result.findings().size() - open;
    String verdict = result.verdict().text().toUpperCase(java.util.Locale.ROOT);
    String counts = open == 1 ? "1 finding" : open + " findings";
    lines.add(
        console.paint(paint(result.verdict()), verdict)
            + "  "
            + Visible.text(result.workbook().fileName())
            + ": "
            + counts
            + (accepted == 0 ? "" : ", " + accepted + " more accepted"));
  }

  private void outcomes() {
    if (result.outcomes().isEmpty()) {
      return;
    }
    lines.add("");
    List<OutcomeFigures> outcomes = result.outcomes();
    for (OutcomeFigures o : outcomes.subList(0, Math.min(MOST_OUTCOMES, outcomes.size()))) {
      int digits = Numbers.digits(o.now(), o.corrected());
      lines.add(
          "  "
              + padded(Visible.shortened(o.label(), MOST_LABEL), MOST_LABEL)
              + "  "
              + Numbers.show(o.now(), digits)
              + " now, "
              + Numbers.show(o.corrected(), digits)
              + " corrected");
    }
    if (result.decisionFlips()) {
      lines.add(
          "  The decision changes at a threshold of " + Numbers.show(result.threshold()) + ".");
    }
  }

  private void findings() {
    List<Finding> open =
        result.findings().stream().filter(finding -> finding.acceptance() == null).toList();
    List<Finding> shown = open.subList(0, Math.min(MOST_FINDINGS, open.size()));
    if (shown.isEmpty()) {
      return;
    }
    lines.add("");
    int width = shown.stream().mapToInt(finding -> cells(finding).length()).max().orElse(0);
    for (Finding finding : shown) {
      String severity = padded(finding.severity().text(), 8);
      lines.add(
          "  "
              + console.paint(paint(finding.severity()), severity)
              + "  "
              + padded(cells(finding), width)
              + "  "
              + Visible.text(finding.rule().title()));
    }
    if (open.size() > shown.size()) {
      lines.add("  and " + (open.size() - shown.size()) + " more");
    }
  }

  private String cells(Finding finding) {
    int others = finding.cells().size() - 1;
    String first = Visible.shortened(result.workbook().show(finding.cells().get(0)), MOST_LABEL);
    return others == 0 ? first : first + " +" + others;
  }

  private static String padded(String text, int width) {
    return text + " ".repeat(Math.max(0, width - text.length()));
  }

  private static Console.Paint paint(Verdict verdict) {
    return switch (verdict) {
      case PASS -> Console.Paint.GREEN;
      case QUERY -> Console.Paint.YELLOW;
      case HOLD -> Console.Paint.RED;
    };
  }

  private static Console.Paint paint(Severity severity) {
    return switch (severity) {
      case CRITICAL -> Console.Paint.RED;
      case MAJOR -> Console.Paint.YELLOW;
      case MINOR -> Console.Paint.FAINT;
      case QUERY -> Console.Paint.BLUE;
    };
  }
}
