package weighhouse.report.html;

import java.util.List;
import java.util.stream.Collectors;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;
import weighhouse.audit.CellFigures;
import weighhouse.audit.Finding;
import weighhouse.audit.Plot;
import weighhouse.report.text.Numbers;
import weighhouse.workbook.Workbook;

/** One finding in full. */
final class FindingArticle {
  private static final List<String> VALUE_HEADS = List.of("Cell", "Now", "Correct", "Change");

  private final AuditResult result;
  private final Workbook workbook;

  FindingArticle(AuditResult result) {
    this.result = result;
    this.workbook = result.workbook();
  }

  void write(Finding finding, Element section) {
    String id = Tags.anchor("f-", finding.id());
    Element article =
        Tags.add(section, "article", "finding " + finding.severity().text())
            .attr("id", id)
            .attr("aria-labelledby", id + "-h");
    Filter.mark(article, finding, workbook);
    head(finding, article, id);
    Element columns = Tags.add(article, "div", "columns");
    Element words = Tags.add(columns, "div", "reading");
    formulas(finding, words);
    FindingWords.write(finding, workbook, words);
    Element figures = Tags.add(columns, "div", "weighing");
    values(finding, figures);
    plots(finding, figures);
    outcomes(finding, figures);
  }

  private void head(Finding finding, Element article, String id) {
    Element head = article.appendElement("header");
    Element title = head.appendElement("h3").attr("id", id + "-h");
    Opening.severity(title, finding.severity());
    Tags.text(title, "span", "", finding.rule().title());
    Element where = Tags.add(head, "p", "where");
    for (var range : finding.cells()) {
      Tags.text(where, "code", "", workbook.show(range));
      where.appendText(" ");
    }
    Tags.text(where, "span", "", traits(finding));
    Tags.text(head, "p", "message", finding.message());
    if (finding.acceptance() != null) {
      Tags.text(head, "p", "accepted", accepted(finding.acceptance()));
    }
  }

  private static String traits(Finding finding) {
    String traits = "· " + finding.certainty().text() + " · " + finding.rule().family();
    traits += finding.silent() ? " · silent at present inputs" : "";
    return finding.decisionFlips() ? traits + " · changes the decision" : traits;
  }

  private static String accepted(Finding.Acceptance acceptance) {
    String until = acceptance.until() == null ? "" : " until " + acceptance.until();
    return "Accepted by " + acceptance.by() + until + ": " + acceptance.reason();
  }

  private void formulas(Finding finding, Element words) {
    Element list = Tags.add(words, "dl", "formulas");
    Tags.text(list, "dt", "", "Stands now in " + workbook.show(finding.host()));
    FormulaLine.write(list.appendElement("dd"), finding.formula(), finding.offending());
    Tags.text(list, "dt", "", "Suggested");
    Element suggested = list.appendElement("dd");
    if (finding.suggestedFormula() == null) {
      suggested.text("No formula can be suggested; see the question to the author.");
      return;
    }
    FormulaLine.write(suggested, finding.suggestedFormula(), null);
    // shown by the script, which alone can copy
    Tags.text(suggested, "button", "copy", "Copy")
        .attr("type", "button")
        .attr("hidden", "")
        .attr("aria-label", "Copy the suggested formula for " + workbook.show(finding.host()));
  }

  private void values(Finding finding, Element figures) {
    if (finding.values().isEmpty()) {
      return;
    }
    Element body = Tags.table(figures, "Values now and correct", VALUE_HEADS);
    for (CellFigures value : finding.values()) {
      Element row = Tags.row(body, "", OutcomeTable.numbers(value.now(), value.correct()));
      Tags.text(row.child(0), "code", "", workbook.show(value.cell()));
    }
  }

  private void plots(Finding finding, Element figures) {
    List<Plot> own =
        result.plots().stream().filter(plot -> plot.about().equals(finding.id())).toList();
    own.forEach(plot -> PlotFigure.write(plot, figures));
  }

  private void outcomes(Finding finding, Element figures) {
    List<weighhouse.audit.OutcomeFigures> moved =
        finding.outcomes().stream().filter(FindingArticle::moves).toList();
    if (!moved.isEmpty()) {
      OutcomeTable.write(figures, "Outcomes with this correction alone", moved, workbook);
    } else if (!finding.outcomes().isEmpty()) {
      String still =
          finding.outcomes().stream()
              .map(outcome -> outcome.label() + " " + Numbers.show(outcome.now()))
              .limit(4)
              .collect(Collectors.joining(", "));
      Tags.text(figures, "p", "still", "This correction alone moves no outcome: " + still + ".");
    }
  }

  private static boolean moves(weighhouse.audit.OutcomeFigures outcome) {
    double now = outcome.now().number();
    double change = Math.abs(outcome.corrected().number() - now);
    return !(change <= 1e-9 * Math.abs(now));
  }
}
