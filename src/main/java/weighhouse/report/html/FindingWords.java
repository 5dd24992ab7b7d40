package weighhouse.report.html;

import java.util.List;
import java.util.regex.Pattern;
import org.jsoup.nodes.Element;
import weighhouse.audit.Finding;
import weighhouse.report.text.Numbers;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** What a finding says: its operands, why it is a mistake, the path, the question, the sources. */
final class FindingWords {
  private static final Pattern DOI = Pattern.compile("10\\.[0-9]{4,9}/[-._;()/:A-Za-z0-9<>]+");

  private FindingWords() {}

  static void write(Finding finding, Workbook workbook, Element words) {
    operands(finding.operands(), words);
    Tags.text(words, "p", "why", finding.explanation());
    if (finding.question() != null && !finding.question().isBlank()) {
      Element question = Tags.add(words, "p", "question");
      Tags.text(question, "strong", "", "For the author:");
      question.appendText(" ");
      Tags.text(question, "span", "", finding.question());
    }
    path(finding.path(), workbook, words);
    if (!finding.notes().isEmpty()) {
      Element notes = Tags.add(words, "ul", "notes").attr("aria-label", "Notes");
      finding.notes().forEach(note -> Tags.text(notes, "li", "", note));
    }
    sources(finding.rule().sources(), words);
    Element imprint = Tags.add(words, "p", "imprint");
    imprint.appendText("Rule ");
    Tags.text(imprint, "code", "", finding.rule().id());
    imprint.appendText(" · finding ");
    Tags.text(imprint, "code", "", finding.id());
  }

  private static void operands(List<Finding.Operand> operands, Element words) {
    if (operands.isEmpty()) {
      return;
    }
    Element list =
        Tags.add(words, "ul", "operands").attr("aria-label", "References of the formula");
    for (Finding.Operand operand : operands) {
      Element item = list.appendElement("li");
      Tags.text(item, "code", "", operand.reference());
      item.appendText(" ");
      Tags.text(item, "span", "label", operand.label());
      Tags.text(item, "span", "kind", " " + operand.quantity());
      Tags.text(item, "span", "number", " = " + Numbers.show(operand.value()));
    }
  }

  private static void path(List<CellAddress> path, Workbook workbook, Element words) {
    if (path.isEmpty()) {
      return;
    }
    Element line = Tags.add(words, "p", "path");
    Tags.text(line, "strong", "", "Path to the result:");
    for (int i = 0; i < path.size(); i++) {
      line.appendText(i == 0 ? " " : " → ");
      Tags.text(line, "code", "", workbook.show(path.get(i)));
    }
  }

  private static void sources(List<Finding.Source> sources, Element words) {
    if (sources.isEmpty()) {
      return;
    }
    Element list = Tags.add(words, "ul", "sources").attr("aria-label", "Sources");
    for (Finding.Source source : sources) {
      Element item = list.appendElement("li");
      Tags.text(item, "cite", "", source.citation());
      if (source.locator() != null) {
        Tags.text(item, "span", "", " " + source.locator() + ".");
      }
      doi(source.doi(), item);
    }
  }

  private static void doi(String doi, Element item) {
    if (doi == null) {
      return;
    }
    item.appendText(" ");
    if (DOI.matcher(doi).matches()) {
      String path = doi.replace("<", "%3C").replace(">", "%3E");
      Tags.text(item, "a", "", "doi:" + doi)
          .attr("href", "https://doi.org/" + path)
          .attr("rel", "noreferrer");
    } else {
      Tags.text(item, "span", "", "doi:" + doi);
    }
  }
}
