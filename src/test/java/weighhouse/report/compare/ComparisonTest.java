package weighhouse.report.compare;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import org.jsoup.Jsoup;
import org.jsoup.nodes.Document;
import org.junit.jupiter.api.Test;
import weighhouse.audit.Finding;
import weighhouse.report.Samples;
import weighhouse.report.html.ComparisonPage;
import weighhouse.report.json.ComparisonJson;

class ComparisonTest {
  private static final Comparison MENDED = Comparison.of(Samples.held(), Samples.passed());

  @Test
  void findingsAreResolvedNewOrStillThere() {
    assertEquals(3, MENDED.resolved().size());
    assertEquals(0, MENDED.added().size());
    Comparison broken = Comparison.of(Samples.passed(), Samples.held());
    assertEquals(3, broken.added().size());
    Comparison same = Comparison.of(Samples.held(), Samples.held());
    assertEquals(
        Samples.held().findings().stream().map(Finding::id).toList(),
        same.remaining().stream().map(Finding::id).toList());
    assertEquals(0, same.measures().size());
  }

  @Test
  void measureThatActsElsewhereHasChanged() {
    Comparison.Moved moved = MENDED.measures().get(0);
    assertEquals("acts on risk before, acts on hazard now", moved.remark());
    assertEquals(1, MENDED.measures().size());
  }

  @Test
  void jsonAndPageTellTheSame() throws Exception {
    ByteArrayOutputStream json = new ByteArrayOutputStream();
    ComparisonJson.write(MENDED, json);
    JsonNode read = new ObjectMapper().readTree(json.toByteArray());
    assertEquals("weighhouse-comparison/1", read.get("schema").asText());
    assertEquals(3, read.get("resolved").size());
    assertEquals("pass", read.at("/after/verdict").asText());
    ByteArrayOutputStream html = new ByteArrayOutputStream();
    ComparisonPage.write(MENDED, html);
    Document page = Jsoup.parse(html.toString(StandardCharsets.UTF_8));
    assertEquals(3, page.select("#resolved tbody tr").size());
    assertTrue(page.selectFirst(".verdict").text().contains("3 resolved, 0 new, 0 still there"));
  }
}
