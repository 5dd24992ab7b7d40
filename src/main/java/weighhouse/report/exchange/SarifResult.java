package weighhouse.report.exchange;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.List;
import weighhouse.audit.Finding;
import weighhouse.audit.Severity;
import weighhouse.report.text.Visible;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/** A finding as a result of SARIF. */
final class SarifResult {
  private final Workbook workbook;
  private final List<String> rules;
  private final JsonGenerator json;

  SarifResult(Workbook workbook, List<String> rules, JsonGenerator json) {
    this.workbook = workbook;
    this.rules = rules;
    this.json = json;
  }

  void write(Finding finding) throws IOException {
    json.writeStartObject();
    json.writeStringField("ruleId", finding.rule().id());
    json.writeNumberField("ruleIndex", rules.indexOf(finding.rule().id()));
    json.writeStringField("kind", finding.severity() == Severity.QUERY ? "review" : "fail");
    json.writeStringField("level", level(finding.severity()));
    text(json, "message", finding.message());
    json.writeArrayFieldStart("locations");
    for (CellRange range : finding.cells()) {
      location(range);
    }
    json.writeEndArray();
    json.writeObjectFieldStart("partialFingerprints");
    json.writeStringField("finding/v1", finding.id());
    json.writeEndObject();
    suppressions(finding.acceptance());
    properties(finding);
    json.writeEndObject();
  }

  /** SARIF allows a level other than none only to results of kind fail. */
  private static String level(Severity severity) {
    return switch (severity) {
      case CRITICAL, MAJOR -> "error";
      case MINOR -> "warning";
      case QUERY -> "none";
    };
  }

  private void location(CellRange range) throws IOException {
    json.writeStartObject();
    json.writeObjectFieldStart("physicalLocation");
    json.writeObjectFieldStart("artifactLocation");
    json.writeStringField("uri", uri(workbook.fileName()));
    json.writeNumberField("index", 0);
    json.writeEndObject();
    json.writeEndObject();
    json.writeArrayFieldStart("logicalLocations");
    json.writeStartObject();
    String shown = Visible.text(workbook.show(range));
    json.writeStringField("name", shown.substring(shown.lastIndexOf('!') + 1));
    json.writeStringField("fullyQualifiedName", shown);
    json.writeStringField("kind", range.size() == 1 ? "cell" : "range");
    json.writeEndObject();
    json.writeEndArray();
    json.writeEndObject();
  }

  private void suppressions(Finding.Acceptance acceptance) throws IOException {
    json.writeArrayFieldStart("suppressions");
    if (acceptance != null) {
      json.writeStartObject();
      json.writeStringField("kind", "external");
      json.writeStringField("status", "accepted");
      json.writeStringField("justification", Visible.text(acceptance.reason()));
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private void properties(Finding finding) throws IOException {
    json.writeObjectFieldStart("properties");
    json.writeStringField("severity", finding.severity().text());
    json.writeStringField("certainty", finding.certainty().text());
    json.writeStringField("formula", Visible.text(finding.formula()));
    if (finding.suggestedFormula() != null) {
      json.writeStringField("suggestedFormula", Visible.text(finding.suggestedFormula()));
    }
    json.writeEndObject();
  }

  static void text(JsonGenerator json, String field, String text) throws IOException {
    json.writeObjectFieldStart(field);
    json.writeStringField("text", Visible.text(text));
    json.writeEndObject();
  }

  static String uri(String fileName) {
    return URLEncoder.encode(fileName, StandardCharsets.UTF_8).replace("+", "%20");
  }
}
