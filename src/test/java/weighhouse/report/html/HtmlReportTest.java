package weighhouse.report.html;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import org.jsoup.Jsoup;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.junit.jupiter.api.Test;
import weighhouse.audit.AuditResult;
import weighhouse.report.Samples;
import weighhouse.report.SchemaCheck;
import weighhouse.report.format.Format;

class HtmlReportTest {
  private static Document parsed(AuditResult result) throws IOException {
    return Jsoup.parse(SchemaCheck.text(Format.HTML, result));
  }

  @Test
  void sectionsComeInTheOrderOfConsequence() throws Exception {
    Document page = parsed(Samples.held());
    assertEquals(
        List.of(
            "decision",
            "foremost",
            "measures",
            "findings",
            "hazards",
            "draws",
            "coverage",
            "quantities",
            "cautions"),
        page.select("section").eachAttr("id"));
    assertEquals("cohort model.xlsm", page.selectFirst("h1").text());
    assertTrue(page.selectFirst(".verdict").text().startsWith("Hold 1 finding to settle"));
  }

  @Test
  void foremostLeavesOutWhatIsAccepted() throws Exception {
    Document page = parsed(Samples.held());
    assertEquals(
        List.of("#f-3fa1c09b7e", "#f-77e0d1aa52"), page.select("ol.foremost a").eachAttr("href"));
  }

  @Test
  void findingShowsItsFormulaWithTheWrongPartMarked() throws Exception {
    Element finding = parsed(Samples.held()).getElementById("f-3fa1c09b7e");
    assertEquals("nputs!$C$8*Inputs!$C$5)", finding.selectFirst("mark").text().substring(1) + ")");
    assertEquals(
        List.of(
            "=MIN(1,Inputs!$C$8*Inputs!$C$5)+IF($B$2>0,0,1)",
            "=1-(1-Inputs!$C$8)^Inputs!$C$5+IF($B$2>0,0,1)"),
        finding.select("code.formula").eachText());
    assertEquals(
        "https://doi.org/10.1177/0272989X9301300409", finding.select(".sources a").attr("href"));
    assertFalse(finding.select("svg.plot path.series").isEmpty());
  }

  @Test
  void everySectionAndTableIsNamed() throws Exception {
    Document page = parsed(Samples.held());
    for (Element section : page.select("section, article")) {
      assertFalse(page.getElementById(section.attr("aria-labelledby")).text().isBlank());
    }
    assertTrue(
        page.select("table").stream().allMatch(table -> table.selectFirst("caption") != null));
    assertTrue(page.select("svg").stream().allMatch(svg -> !svg.attr("aria-label").isBlank()));
    assertEquals(
        page.select("[id]").size(), page.select("[id]").eachAttr("id").stream().distinct().count());
  }

  @Test
  void loadsNothingAndStylesNothingInline() throws Exception {
    Document page = parsed(Samples.held());
    assertTrue(page.select("link, img, iframe, script[src], [style]").isEmpty());
    assertTrue(
        page.select("meta[http-equiv=Content-Security-Policy]")
            .attr("content")
            .matches(
                "default-src 'none'; style-src 'sha256-[^ ]+'; script-src 'sha256-[^ ]+'; .*"));
  }

  @Test
  void hostileTextStaysText() throws Exception {
    Document page = parsed(Samples.hostile());
    assertEquals(1, page.select("script").size());
    assertTrue(page.select("[onload], b:not(footer b)").isEmpty());
    assertTrue(page.select("a[href^=javascript]").isEmpty());
    String raw = page.outerHtml();
    assertTrue(raw.contains("‹U+202E›txt"), "direction marks are spelled out");
    assertTrue(raw.contains("‹U+001B›[31m"), "terminal escapes are spelled out");
    assertEquals(-1, raw.indexOf('\u202E'));
    assertEquals(-1, raw.indexOf('\u001B'));
    assertEquals(-1, raw.indexOf('\u0000'));
  }

  @Test
  void workbookWithoutFindingsIsAPage() throws Exception {
    Document page = parsed(Samples.passed());
    assertTrue(page.selectFirst(".verdict").text().startsWith("Pass"));
    assertTrue(page.select("article").isEmpty());
  }

  @Test
  void manyFindingsHaveATableToLookThemUp() throws Exception {
    Document page = parsed(Samples.many(300));
    assertEquals(300, page.select(".overview tbody tr").size());
    assertEquals(300, page.select("article.finding").size());
  }
}
