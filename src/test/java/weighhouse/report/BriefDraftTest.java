package weighhouse.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.ObjectMapper;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import weighhouse.audit.Brief;
import weighhouse.audit.brief.BriefDraft;
import weighhouse.audit.brief.BriefReader;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;

/** A draft is a brief; the brief's schema says of it what the reader says. */
class BriefDraftTest {
  private static final Path SCHEMA = Path.of("docs/schema/brief.schema.json");

  private static String json(String yaml) throws Exception {
    Object loaded = new Load(LoadSettings.builder().build()).loadFromString(yaml);
    return new ObjectMapper().writeValueAsString(loaded);
  }

  @Test
  void draftIsReadBack() throws Exception {
    String yaml = BriefDraft.of(Samples.held());
    Brief brief = BriefReader.read(yaml);
    assertEquals(1 / 12.0, brief.cycleYears(), 1e-12);
    assertEquals(20000, brief.threshold());
    assertEquals(4, brief.outcomes().size());
    assertEquals(
        Map.of(
            "Inputs!C5",
            Quantity.of(Kind.HAZARD_RATIO),
            "'Model B'!D5:D484",
            weighhouse.audit.brief.QuantityText.parse("probability over 1 month")),
        brief.quantities());
    assertTrue(yaml.contains("# label: label “HR (95% CI)” in Inputs!C3"), yaml);
    SchemaCheck.assertValid(json(yaml), SCHEMA);
  }

  @Test
  void hostileTextStaysInItsPlace() throws Exception {
    Brief brief = BriefReader.read(BriefDraft.of(Samples.hostile()));
    assertEquals(List.of(), brief.accepted());
    assertEquals(2, brief.quantities().size());
  }

  @Test
  void schemaRefusesWhatTheReaderRefuses() throws Exception {
    for (String yaml :
        List.of(
            "treshold: 1",
            "outcomes: [C10]",
            "gate: {hold-at: grave}",
            "gate: {least-coverage: 95}",
            "accepted: [{finding: x}]")) {
      assertTrue(!SchemaCheck.faults(json(yaml), SCHEMA).isEmpty(), yaml);
    }
  }
}
