package weighhouse.report.json;

import com.fasterxml.jackson.core.JsonEncoding;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.OutputStream;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Figure;
import weighhouse.report.compare.Comparison;

/** A comparison as JSON, schema {@code weighhouse-comparison/1}. */
public final class ComparisonJson {
  private ComparisonJson() {}

  public static void write(Comparison comparison, OutputStream out) throws IOException {
    JsonFactory factory = new JsonFactory();
    factory.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
    try (JsonGenerator generator = factory.createGenerator(out, JsonEncoding.UTF8)) {
      generator.useDefaultPrettyPrinter();
      // the findings of the two audits are of two workbooks, so each has its own addresses
      Json then = new Json(generator, comparison.before().workbook());
      Json now = new Json(generator, comparison.after().workbook());
      now.object(() -> top(comparison, then, now));
    }
  }

  private static void top(Comparison comparison, Json then, Json now) throws IOException {
    now.text("schema", "weighhouse-comparison/1");
    now.object("before", () -> audit(comparison.before(), now));
    now.object("after", () -> audit(comparison.after(), now));
    then.list("resolved", comparison.resolved(), new FindingJson(then)::write);
    now.list("new", comparison.added(), new FindingJson(now)::write);
    now.list("remaining", comparison.remaining(), new FindingJson(now)::write);
    now.list("measures", comparison.measures(), moved -> moved(moved, now));
    now.list("inputs", comparison.inputs(), moved -> moved(moved, now));
    now.list("outcomes", comparison.outcomes(), moved -> moved(moved, now));
  }

  private static void audit(AuditResult result, Json json) throws IOException {
    json.text("file", result.workbook().fileName());
    json.text("sha256", result.workbook().sha256());
    json.text("verdict", result.verdict().text());
  }

  private static void moved(Comparison.Moved moved, Json json) throws IOException {
    json.text("label", moved.label());
    json.text("cell", moved.cell());
    Figure none = Figure.of(Double.NaN);
    json.pair(
        "before",
        moved.before() == null ? none : moved.before(),
        "after",
        moved.after() == null ? none : moved.after());
    json.text("remark", moved.remark());
  }
}
