package weighhouse.report.exchange;

import com.fasterxml.jackson.core.JsonEncoding;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.report.ReportWriter;

/** Findings as SARIF 2.1.0: one run, cells as logical locations, no text regions. */
public final class SarifReport implements ReportWriter {
  private static final String SCHEMA =
      "https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json";

  @Override
  public void write(AuditResult result, OutputStream out) throws IOException {
    JsonFactory factory = new JsonFactory();
    factory.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
    try (JsonGenerator json = factory.createGenerator(out, JsonEncoding.UTF8)) {
      json.useDefaultPrettyPrinter();
      json.writeStartObject();
      json.writeStringField("$schema", SCHEMA);
      json.writeStringField("version", "2.1.0");
      json.writeArrayFieldStart("runs");
      run(result, json);
      json.writeEndArray();
      json.writeEndObject();
    }
  }

  private static void run(AuditResult result, JsonGenerator json) throws IOException {
    Map<String, Finding.RuleText> rules = new LinkedHashMap<>();
    result.findings().forEach(f -> rules.putIfAbsent(f.rule().id(), f.rule()));
    json.writeStartObject();
    json.writeObjectFieldStart("tool");
    json.writeObjectFieldStart("driver");
    json.writeStringField("name", "Weighhouse");
    json.writeArrayFieldStart("rules");
    for (Finding.RuleText rule : rules.values()) {
      rule(rule, json);
    }
    json.writeEndArray();
    json.writeEndObject();
    json.writeEndObject();
    json.writeStringField("columnKind", "utf16CodeUnits");
    artifact(result, json);
    json.writeArrayFieldStart("results");
    SarifResult writer = new SarifResult(result.workbook(), new ArrayList<>(rules.keySet()), json);
    for (Finding finding : result.findings()) {
      writer.write(finding);
    }
    json.writeEndArray();
    json.writeEndObject();
  }

  private static void rule(Finding.RuleText rule, JsonGenerator json) throws IOException {
    json.writeStartObject();
    json.writeStringField("id", rule.id());
    SarifResult.text(json, "shortDescription", rule.title());
    json.writeObjectFieldStart("properties");
    json.writeArrayFieldStart("tags");
    for (String tag : List.of(rule.family())) {
      json.writeString(tag);
    }
    json.writeEndArray();
    json.writeEndObject();
    json.writeEndObject();
  }

  private static void artifact(AuditResult result, JsonGenerator json) throws IOException {
    json.writeArrayFieldStart("artifacts");
    json.writeStartObject();
    json.writeObjectFieldStart("location");
    json.writeStringField("uri", SarifResult.uri(result.workbook().fileName()));
    json.writeEndObject();
    json.writeObjectFieldStart("hashes");
    json.writeStringField("sha-256", result.workbook().sha256());
    json.writeEndObject();
    json.writeEndObject();
    json.writeEndArray();
  }
}
