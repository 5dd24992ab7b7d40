package weighhouse.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import weighhouse.audit.AuditResult;
import weighhouse.report.format.Format;

/** Holds JSON against the published schemas. */
public final class SchemaCheck {
  private SchemaCheck() {}

  /** Fails with every fault that the schema finds. */
  public static void assertValid(String json, Path schema) throws IOException {
    assertEquals(List.of(), faults(json, schema));
  }

  /** All faults that the schema finds. */
  public static List<String> faults(String json, Path schema) throws IOException {
    SchemaRegistry registry = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
    Schema loaded = registry.getSchema(Files.readString(schema), InputFormat.JSON);
    return loaded.validate(json, InputFormat.JSON).stream().map(Object::toString).toList();
  }

  /** The report as text. */
  public static String text(Format format, AuditResult result) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    format.writer().write(result, out);
    return out.toString(StandardCharsets.UTF_8);
  }
}
