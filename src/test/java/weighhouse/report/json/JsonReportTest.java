package weighhouse.report.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import weighhouse.audit.AuditResult;
import weighhouse.report.Samples;
import weighhouse.report.SchemaCheck;
import weighhouse.report.format.Format;

class JsonReportTest {
  private static final Path SCHEMA = Path.of("docs/schema/audit.schema.json");

  static Stream<AuditResult> valid() {
    return Stream.of(Samples.held(), Samples.passed(), Samples.many(30));
  }

  @ParameterizedTest
  @MethodSource("valid")
  void followsThePublishedSchema(AuditResult result) throws Exception {
    SchemaCheck.assertValid(SchemaCheck.text(Format.JSON, result), SCHEMA);
  }

  @Test
  void schemaRefusesWhatIsNoAudit() throws Exception {
    String json = SchemaCheck.text(Format.JSON, Samples.held());
    List<String> faults =
        SchemaCheck.faults(
            json.replace("\"hold\"", "\"perhaps\"").replace("\"cell\"", "\"at\""), SCHEMA);
    assertTrue(faults.size() > 1, faults.toString());
  }

  @Test
  void errorsStandBesideNull() throws Exception {
    JsonNode json = new ObjectMapper().readTree(SchemaCheck.text(Format.JSON, Samples.held()));
    JsonNode outcome = json.at("/outcomes/3");
    assertTrue(outcome.get("now").isNull());
    assertEquals("#DIV/0!", outcome.get("error").asText());
    assertEquals(-414.6, outcome.get("allCorrected").asDouble());
    assertFalse(json.at("/outcomes/0").has("error"));
  }

  @Test
  void addressesAreExcelsOwn() throws Exception {
    JsonNode json = new ObjectMapper().readTree(SchemaCheck.text(Format.JSON, Samples.held()));
    assertEquals("'Model B'!D5:D484", json.at("/findings/0/cells/0").asText());
    assertEquals("Inputs!C5", json.at("/measures/0/cell").asText());
    assertEquals(0.7, json.at("/measures/0/entered").asDouble());
    assertEquals(0.81, json.at("/measures/0/effective/max").asDouble());
    assertTrue(json.at("/measures/1/effective").isNull());
    assertEquals("2027-01-31", json.at("/findings/1/accepted/until").asText());
  }

  @Test
  void sameAuditGivesSameBytes() throws Exception {
    assertEquals(
        SchemaCheck.text(Format.JSON, Samples.held()),
        SchemaCheck.text(Format.JSON, Samples.held()));
  }
}
