package weighhouse.report.html;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.audit.OutcomeFigures;
import weighhouse.audit.Severity;
import weighhouse.report.plot.Balance;
import weighhouse.report.text.Numbers;

/** The first screen: the verdict, what moves in the decision, the findings that matter most. */
final class Opening {
  private static final int MOST_FINDINGS = 3;
  private static final int MOST_OUTCOMES = 6;

  private Opening() {}

  static void write(AuditResult result, Element body) {
    Tags.text(body, "a", "skip", "Skip to the findings").attr("href", "#findings");
    Element header = Tags.add(body, "header", "opening verdict-" + result.verdict().text());
    title(result, header);
    Element columns = Tags.add(header, "div", "columns");
    decision(result, columns);
    foremost(result, columns);
  }

  private static void title(AuditResult result, Element header) {
    Element plate = Tags.add(header, "div", "plate");
    Balance.draw(plate, result.verdict());
    Element words = Tags.add(plate, "div", "words");
    Tags.text(words, "p", "house", "Weighhouse · audit of effect measures");
    Tags.text(words, "h1", "", result.workbook().fileName());
    Element line = Tags.add(words, "p", "verdict");
    Tags.text(line, "strong", "", VerdictWords.word(result.verdict()));
    line.appendText(" ");
    Tags.text(line, "span", "", VerdictWords.sentence(result));
  }

  private static void decision(AuditResult result, Element columns) {
    Element section = Tags.section(columns, "decision", "What moves in the decision");
    if (result.outcomes().isEmpty()) {
      Tags.text(
          section,
          "p",
          "",
          "No outcome was found in the workbook. Name the cells under “outcomes” in a brief.");
      return;
    }
    Tags.text(section, "p", "lead", decisionSentence(result));
    List<OutcomeFigures> outcomes = result.outcomes();
    OutcomeTable.write(
        section,
        "All corrections together",
        outcomes.subList(0, Math.min(MOST_OUTCOMES, outcomes.size())),
        result.workbook());
    if (outcomes.size() > MOST_OUTCOMES) {
      OutcomeTable.write(
          Tags.details(section, "All " + outcomes.size() + " outcomes"),
          "All corrections together, all outcomes",
          outcomes,
          result.workbook());
    }
  }

  private static String decisionSentence(AuditResult result) {
    String at =
        Double.isNaN(result.threshold())
            ? "; the workbook tells no threshold"
            : " at a threshold of " + Numbers.show(result.threshold());
    return result.decisionFlips()
        ? "The decision changes" + at + "."
        : "The decision stays the same" + at + ".";
  }

  private static void foremost(AuditResult result, Element columns) {
    List<Finding> open = result.findings().stream().filter(f -> f.acceptance() == null).toList();
    List<Finding> foremost = open.subList(0, Math.min(MOST_FINDINGS, open.size()));
    Element section = Tags.section(columns, "foremost", "What matters most");
    if (foremost.isEmpty()) {
      Tags.text(section, "p", "lead", "Nothing was found that is not accepted.");
      return;
    }
    Element list = Tags.add(section, "ol", "foremost");
    for (Finding finding : foremost) {
      Element item = list.appendElement("li");
      Element head = Tags.add(item, "p", "head");
      severity(head, finding.severity());
      Tags.text(head, "a", "", finding.rule().title())
          .attr("href", "#" + Tags.anchor("f-", finding.id()));
      Element where = Tags.add(item, "p", "where");
      Tags.text(where, "code", "", result.workbook().show(finding.cells().get(0)));
      Tags.text(item, "p", "message", finding.message());
    }
  }

  static void severity(Element parent, Severity severity) {
    Tags.text(parent, "span", "severity " + severity.text(), Tags.capital(severity.text()));
    parent.appendText(" ");
  }
}
