package weighhouse.report.html;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.workbook.Workbook;

/** All findings: the filter, a table to look one up, and each in full. */
final class Findings {
  private static final int WORTH_A_TABLE = 4;

  private Findings() {}

  static void write(AuditResult result, Element main) {
    Element section = Tags.section(main, "findings", "Findings");
    List<Finding> findings = result.findings();
    if (findings.isEmpty()) {
      Tags.text(section, "p", "", "Nothing was found. See the coverage for what was analysed.");
      return;
    }
    Filter.write(findings, result.workbook(), section);
    if (findings.size() >= WORTH_A_TABLE) {
      overview(findings, result.workbook(), section);
    }
    FindingArticle article = new FindingArticle(result);
    findings.forEach(finding -> article.write(finding, section));
  }

  private static void overview(List<Finding> findings, Workbook workbook, Element section) {
    Element body =
        Tags.table(
            section,
            "All findings, most consequential first",
            List.of("Severity", "Finding", "Cells", "Certainty"));
    body.parent().addClass("overview");
    for (Finding finding : findings) {
      Element row = body.appendElement("tr");
      Filter.mark(row, finding, workbook);
      Opening.severity(row.appendElement("td"), finding.severity());
      Element head = row.appendElement("th").attr("scope", "row");
      Tags.text(head, "a", "", finding.rule().title())
          .attr("href", "#" + Tags.anchor("f-", finding.id()));
      Tags.text(row.appendElement("td"), "code", "", cells(finding, workbook));
      Tags.text(row, "td", "", finding.certainty().text());
    }
  }

  private static String cells(Finding finding, Workbook workbook) {
    String first = workbook.show(finding.cells().get(0));
    int others = finding.cells().size() - 1;
    return others == 0 ? first : first + " +" + others;
  }
}
