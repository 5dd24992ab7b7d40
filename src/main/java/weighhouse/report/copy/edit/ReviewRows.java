package weighhouse.report.copy.edit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import weighhouse.audit.AuditResult;
import weighhouse.audit.CellFigures;
import weighhouse.audit.Figure;
import weighhouse.audit.Finding;
import weighhouse.audit.OutcomeFigures;
import weighhouse.report.text.Visible;
import weighhouse.workbook.CellAddress;

/** The rows of the sheet that lists the findings. */
final class ReviewRows {
  private ReviewRows() {}

  static List<Edits.ReviewRow> of(
      AuditResult result, List<Finding> findings, Map<CellAddress, String> written) {
    List<Edits.ReviewRow> rows = new ArrayList<>();
    row(
        rows,
        null,
        "Findings of the audit; each needs a qualified reviewer, and the agency's own guidance rules.");
    row(
        rows,
        null,
        "Severity",
        "Cells",
        "Finding",
        "Formula as audited",
        "Suggested formula",
        "Cell",
        "Value now",
        "Value corrected",
        "Written here",
        "Question for the author",
        "Id");
    findings.forEach(finding -> finding(rows, finding, result, written));
    row(rows, null);
    row(rows, null, "Outcome", "Cell", "", "", "", "", "Now", "All corrected");
    for (OutcomeFigures o : result.outcomes()) {
      String cell = result.workbook().show(o.cell());
      row(
          rows,
          cell,
          Visible.text(o.label()),
          cell,
          "",
          "",
          "",
          "",
          value(o.now()),
          value(o.corrected()));
    }
    return rows;
  }

  private static void finding(
      List<Edits.ReviewRow> rows, Finding f, AuditResult result, Map<CellAddress, String> written) {
    String cells = String.join(" ", f.cells().stream().map(result.workbook()::show).toList());
    CellFigures first = f.values().isEmpty() ? null : f.values().get(0);
    row(
        rows,
        result.workbook().show(f.cells().get(0)),
        f.severity().text(),
        Visible.text(cells),
        Visible.text(f.message()),
        Visible.text(f.formula()),
        f.suggestedFormula() == null ? "" : Visible.text(f.suggestedFormula()),
        first == null ? "" : Visible.text(result.workbook().show(first.cell())),
        first == null ? "" : value(first.now()),
        first == null ? "" : value(first.correct()),
        written.containsKey(f.host()) ? "yes" : "no",
        Visible.text(f.question()),
        Visible.text(f.id()));
  }

  private static Object value(Figure figure) {
    return figure.error() != null ? figure.error() : (Object) figure.number();
  }

  private static void row(List<Edits.ReviewRow> rows, String link, Object... cells) {
    rows.add(new Edits.ReviewRow(link, Arrays.asList(cells)));
  }
}
