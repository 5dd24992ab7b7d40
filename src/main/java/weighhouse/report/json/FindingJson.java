package weighhouse.report.json;

import java.io.IOException;
import weighhouse.audit.CellFigures;
import weighhouse.audit.Finding;

/** The fields of a finding. */
final class FindingJson {
  private final Json json;

  FindingJson(Json json) {
    this.json = json;
  }

  void write(Finding finding) throws IOException {
    json.text("id", finding.id());
    json.text("rule", finding.rule().id());
    json.text("family", finding.rule().family());
    json.text("title", finding.rule().title());
    json.text("severity", finding.severity().text());
    json.text("certainty", finding.certainty().text());
    json.texts("cells", finding.cells().stream().map(json::show).toList());
    json.text("formula", finding.formula());
    offending(finding);
    json.text("suggestedFormula", finding.suggestedFormula());
    json.list("values", finding.values(), this::value);
    json.list("outcomes", finding.outcomes(), outcome -> json.outcome(outcome, "corrected"));
    json.bool("decisionFlips", finding.decisionFlips());
    json.bool("silent", finding.silent());
    words(finding);
    accepted(finding.acceptance());
  }

  private void words(Finding finding) throws IOException {
    json.text("message", finding.message());
    json.text("explanation", finding.explanation());
    json.text("question", finding.question());
    json.list("operands", finding.operands(), this::operand);
    json.texts("path", finding.path().stream().map(json::show).toList());
    json.texts("notes", finding.notes());
    json.list("sources", finding.rule().sources(), this::source);
  }

  /** Characters of {@code formula} that are wrong, the end not included. */
  private void offending(Finding finding) throws IOException {
    if (finding.offending() == null) {
      json.nothing("offending");
      return;
    }
    json.object(
        "offending",
        () -> {
          json.integer("start", finding.offending().start());
          json.integer("end", finding.offending().end());
        });
  }

  private void value(CellFigures value) throws IOException {
    json.text("cell", json.show(value.cell()));
    json.pair("now", value.now(), "correct", value.correct());
  }

  private void operand(Finding.Operand operand) throws IOException {
    json.text("reference", operand.reference());
    json.text("label", operand.label());
    json.text("quantity", operand.quantity());
    json.number("value", operand.value().number());
    if (operand.value().error() != null) {
      json.text("error", operand.value().error());
    }
  }

  private void source(Finding.Source source) throws IOException {
    json.text("key", source.key());
    json.text("citation", source.citation());
    json.text("at", source.locator());
    json.text("doi", source.doi());
  }

  private void accepted(Finding.Acceptance acceptance) throws IOException {
    if (acceptance == null) {
      json.nothing("accepted");
      return;
    }
    json.object(
        "accepted",
        () -> {
          json.text("reason", acceptance.reason());
          json.text("by", acceptance.by());
          json.text("until", acceptance.until());
        });
  }
}
