package weighhouse.report.exchange;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import weighhouse.audit.AuditResult;
import weighhouse.audit.CellFigures;
import weighhouse.audit.Figure;
import weighhouse.audit.Finding;
import weighhouse.report.ReportWriter;
import weighhouse.report.text.Visible;

/**
 * Findings as comma-separated values (RFC 4180, UTF-8), one a line. A field that a spreadsheet
 * would take for a formula gets an apostrophe in front.
 */
public final class CsvReport implements ReportWriter {
  private static final String HEAD =
      "id,rule,family,severity,certainty,cells,formula,suggested formula,worst cell,now,correct,"
          + "decision changes,accepted,message";

  @Override
  public void write(AuditResult result, OutputStream out) throws IOException {
    StringBuilder text = new StringBuilder(HEAD).append("\r\n");
    for (Finding finding : result.findings()) {
      text.append(
              fields(finding, result).stream()
                  .map(CsvReport::field)
                  .collect(Collectors.joining(",")))
          .append("\r\n");
    }
    out.write(text.toString().getBytes(StandardCharsets.UTF_8));
  }

  private static List<String> fields(Finding finding, AuditResult result) {
    CellFigures worst = Worst.of(finding);
    return Arrays.asList(
        finding.id(),
        finding.rule().id(),
        finding.rule().family(),
        finding.severity().text(),
        finding.certainty().text(),
        finding.cells().stream().map(result.workbook()::show).collect(Collectors.joining(" ")),
        finding.formula(),
        finding.suggestedFormula(),
        worst == null ? null : result.workbook().show(worst.cell()),
        worst == null ? null : number(worst.now()),
        worst == null ? null : number(worst.correct()),
        finding.decisionFlips() ? "yes" : "no",
        finding.acceptance() == null ? null : finding.acceptance().reason(),
        finding.message());
  }

  private static String number(Figure figure) {
    return figure.error() != null ? figure.error() : Double.toString(figure.number());
  }

  private static String field(String raw) {
    String text = Visible.text(raw);
    String guarded = readsAsFormula(text) ? "'" + text : text;
    boolean quoted = guarded.chars().anyMatch(c -> c == ',' || c == '"' || c == ';');
    return quoted ? '"' + guarded.replace("\"", "\"\"") + '"' : guarded;
  }

  private static boolean readsAsFormula(String text) {
    String start = text.stripLeading();
    return !start.isEmpty()
        && "=+-@\uff1d\uff0b\uff0d\uff20".indexOf(start.charAt(0)) >= 0
        && !isNumber(text);
  }

  private static boolean isNumber(String text) {
    return text.matches("-?[0-9.]+(E-?[0-9]+)?");
  }
}
