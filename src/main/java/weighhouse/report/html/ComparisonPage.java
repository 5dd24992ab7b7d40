package weighhouse.report.html;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.Figure;
import weighhouse.audit.Finding;
import weighhouse.report.compare.Comparison;
import weighhouse.workbook.Workbook;

/** A comparison as one page. */
public final class ComparisonPage {
  private static final Figure NONE = Figure.of(Double.NaN);

  private ComparisonPage() {}

  public static void write(Comparison comparison, OutputStream out) throws IOException {
    Workbook then = comparison.before().workbook();
    Workbook now = comparison.after().workbook();
    Page page = new Page(then.fileName() + " and " + now.fileName() + " compared");
    head(comparison, page.body());
    Element main = page.body().appendElement("main");
    findings(main, "resolved", "Resolved", comparison.resolved(), then);
    findings(main, "new", "New", comparison.added(), now);
    findings(main, "remaining", "Still there", comparison.remaining(), now);
    figures(main, "measures", "Effect measures that changed", comparison.measures());
    figures(main, "inputs", "Other inputs that changed", comparison.inputs());
    Cautions.write(main);
    out.write(page.document().outerHtml().getBytes(StandardCharsets.UTF_8));
  }

  private static void head(Comparison comparison, Element body) {
    Element header = Tags.add(body, "header", "opening");
    Element words = Tags.add(Tags.add(header, "div", "plate"), "div", "words");
    Tags.text(words, "p", "house", "Weighhouse · two audits compared");
    String then = comparison.before().workbook().fileName();
    String now = comparison.after().workbook().fileName();
    Tags.text(words, "h1", "", then + " → " + now);
    Tags.text(
        words,
        "p",
        "verdict",
        VerdictWords.word(comparison.before().verdict())
            + " before, "
            + VerdictWords.word(comparison.after().verdict())
            + " now: "
            + comparison.resolved().size()
            + " resolved, "
            + comparison.added().size()
            + " new, "
            + comparison.remaining().size()
            + " still there.");
    figures(header, "outcomes", "Outcomes as the workbooks are", comparison.outcomes());
  }

  private static void findings(
      Element main, String id, String heading, List<Finding> findings, Workbook workbook) {
    Element section = Tags.section(main, id, heading + " (" + findings.size() + ")");
    if (findings.isEmpty()) {
      Tags.text(section, "p", "", "None.");
      return;
    }
    Element body =
        Tags.table(section, heading, List.of("Severity", "Finding", "Cells", "Message", "Id"));
    for (Finding finding : findings) {
      Element row = body.appendElement("tr");
      Opening.severity(row.appendElement("td"), finding.severity());
      Tags.text(row, "th", "", finding.rule().title()).attr("scope", "row");
      Tags.text(row.appendElement("td"), "code", "", workbook.show(finding.cells().get(0)));
      Tags.text(row, "td", "", finding.message());
      Tags.text(row.appendElement("td"), "code", "", finding.id());
    }
  }

  private static void figures(
      Element parent, String id, String heading, List<Comparison.Moved> all) {
    Element section = Tags.section(parent, id, heading);
    if (all.isEmpty()) {
      Tags.text(section, "p", "", "None.");
      return;
    }
    List<String> heads = List.of("What", "Before", "Now", "Change", "Cell", "Remark");
    Element body = Tags.table(section, heading, heads);
    for (Comparison.Moved moved : all) {
      Figure before = moved.before() == null ? NONE : moved.before();
      Figure after = moved.after() == null ? NONE : moved.after();
      Element row = Tags.row(body, moved.label(), OutcomeTable.numbers(before, after));
      Tags.text(row.appendElement("td"), "code", "", moved.cell());
      Tags.text(row, "td", "", moved.remark());
    }
  }
}
