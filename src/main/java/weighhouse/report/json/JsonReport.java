package weighhouse.report.json;

import com.fasterxml.jackson.core.JsonEncoding;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.OutputStream;
import weighhouse.audit.AuditResult;
import weighhouse.audit.QuantityRow;
import weighhouse.report.ReportWriter;
import weighhouse.workbook.Workbook;

/** Writes an audit as UTF-8 JSON, schema {@code weighhouse-audit/1}. */
public final class JsonReport implements ReportWriter {
  /** Name and version of the schema. */
  public static final String SCHEMA = "weighhouse-audit/1";

  @Override
  public void write(AuditResult result, OutputStream out) throws IOException {
    JsonFactory factory = new JsonFactory();
    factory.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
    try (JsonGenerator generator = factory.createGenerator(out, JsonEncoding.UTF8)) {
      generator.setPrettyPrinter(lines());
      Json json = new Json(generator, result.workbook());
      json.object(() -> top(result, json));
    }
  }

  private static DefaultPrettyPrinter lines() {
    return new DefaultPrettyPrinter().withObjectIndenter(new DefaultIndenter(" ", "\n"));
  }

  private static void top(AuditResult result, Json json) throws IOException {
    json.text("schema", SCHEMA);
    json.object("workbook", () -> workbook(result, json));
    json.text("verdict", result.verdict().text());
    json.bool("decisionFlips", result.decisionFlips());
    json.number("threshold", result.threshold());
    json.text("cycle", result.cycle());
    FindingJson findings = new FindingJson(json);
    json.list("findings", result.findings(), findings::write);
    json.list("measures", result.measures(), measure -> MeasureJson.write(measure, json));
    json.list("outcomes", result.outcomes(), outcome -> json.outcome(outcome, "allCorrected"));
    json.object("coverage", () -> CoverageJson.write(result.coverage(), json));
    json.list("quantities", result.quantities(), row -> quantity(row, json));
    json.list("plots", result.plots(), plot -> PlotJson.write(plot, json));
  }

  private static void workbook(AuditResult result, Json json) throws IOException {
    Workbook workbook = result.workbook();
    json.text("file", workbook.fileName());
    json.text("sha256", workbook.sha256());
    json.integer("sheets", workbook.sheets().size());
    json.integer("formulaCells", result.coverage().formulaCells());
    json.integer("formulaShapes", result.formulaShapes());
    json.bool("macros", !workbook.macros().isEmpty());
    json.integer("externalLinks", workbook.externalLinks().size());
  }

  private static void quantity(QuantityRow row, Json json) throws IOException {
    json.text("range", json.show(row.range()));
    json.text("label", row.label());
    json.text("kind", row.kind());
    json.text("span", row.span());
    json.texts("evidence", row.evidence());
    json.text("basis", row.basis());
  }
}
