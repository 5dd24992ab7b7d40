package weighhouse.report.html;

import java.io.IOException;
import java.io.OutputStream;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import org.jsoup.nodes.Element;
import weighhouse.audit.Severity;
import weighhouse.report.IndexEntry;

/** One page that lists several audited workbooks, those that need most work first. */
public final class IndexPage {
  private static final List<String> HEADS =
      List.of("Workbook", "Verdict", "Critical", "Major", "Minor", "Query", "Decision", "Reports");

  private IndexPage() {}

  public static void write(List<IndexEntry> entries, OutputStream out) throws IOException {
    Page page = new Page("Audited workbooks");
    Element header = Tags.add(page.body(), "header", "opening");
    Element words = Tags.add(Tags.add(header, "div", "plate"), "div", "words");
    Tags.text(words, "p", "house", "Weighhouse · audit of effect measures");
    Tags.text(words, "h1", "", Tags.count(entries.size(), "workbook"));
    Element main = page.body().appendElement("main");
    Element body = Tags.table(main, "Audited workbooks, gravest first", HEADS);
    body.parent().addClass("index");
    entries.stream().sorted(gravestFirst()).forEach(entry -> row(body, entry));
    Cautions.write(main);
    out.write(page.document().outerHtml().getBytes(StandardCharsets.UTF_8));
  }

  private static Comparator<IndexEntry> gravestFirst() {
    Comparator<IndexEntry> order =
        Comparator.comparing((IndexEntry entry) -> entry.problem() == null);
    for (Severity severity : Severity.values()) {
      order = order.thenComparing(entry -> -entry.findings().getOrDefault(severity, 0));
    }
    return order.thenComparing(IndexEntry::name);
  }

  private static void row(Element body, IndexEntry entry) {
    Element row = body.appendElement("tr");
    Tags.text(row, "th", "", entry.name()).attr("scope", "row");
    if (entry.problem() != null) {
      Tags.text(row, "td", "", entry.problem()).attr("colspan", "7");
      return;
    }
    Tags.text(row, "td", "verdict-" + entry.verdict().text(), VerdictWords.word(entry.verdict()));
    for (Severity severity : Severity.values()) {
      Tags.text(row, "td", "number", Integer.toString(entry.findings().get(severity)));
    }
    Tags.text(row, "td", "", entry.decisionFlips() ? "changes" : "stays");
    links(entry, row.appendElement("td"));
  }

  private static void links(IndexEntry entry, Element cell) {
    for (Map.Entry<String, String> report : entry.reports().entrySet()) {
      Tags.text(cell, "a", "", report.getKey())
          .attr(
              "href",
              "./"
                  + URLEncoder.encode(report.getValue(), StandardCharsets.UTF_8)
                      .replace("+", "%20"))
          .attr("aria-label", report.getKey() + " report of " + entry.name());
      cell.appendText(" ");
    }
  }
}
