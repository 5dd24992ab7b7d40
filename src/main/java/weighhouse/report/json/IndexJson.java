package weighhouse.report.json;

import com.fasterxml.jackson.core.JsonEncoding;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.Map;
import weighhouse.audit.Severity;
import weighhouse.report.IndexEntry;

/** The list of several audited workbooks as JSON, schema {@code weighhouse-index/1}. */
public final class IndexJson {
  private IndexJson() {}

  public static void write(List<IndexEntry> entries, OutputStream out) throws IOException {
    JsonFactory factory = new JsonFactory();
    factory.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
    try (JsonGenerator generator = factory.createGenerator(out, JsonEncoding.UTF8)) {
      generator.useDefaultPrettyPrinter();
      Json json = new Json(generator, null);
      json.object(
          () -> {
            json.text("schema", "weighhouse-index/1");
            json.list("workbooks", entries, entry -> entry(entry, json));
          });
    }
  }

  private static void entry(IndexEntry entry, Json json) throws IOException {
    json.text("file", entry.name());
    json.text("verdict", entry.verdict() == null ? null : entry.verdict().text());
    json.object(
        "findings",
        () -> {
          for (Map.Entry<Severity, Integer> count : entry.findings().entrySet()) {
            json.integer(count.getKey().text(), count.getValue());
          }
        });
    json.bool("decisionFlips", entry.decisionFlips());
    json.object(
        "reports",
        () -> {
          for (Map.Entry<String, String> report : entry.reports().entrySet()) {
            json.text(report.getKey(), report.getValue());
          }
        });
    json.text("problem", entry.problem());
  }
}
