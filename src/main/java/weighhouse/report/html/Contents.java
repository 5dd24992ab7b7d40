package weighhouse.report.html;

import java.util.LinkedHashMap;
import java.util.Map;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;

/** Links to the sections. */
final class Contents {
  private Contents() {}

  static void write(AuditResult result, Element body) {
    Map<String, String> links = new LinkedHashMap<>();
    links.put("measures", "Measures (" + result.measures().size() + ")");
    links.put("findings", "Findings (" + result.findings().size() + ")");
    if (Evidence.hasHazards(result)) {
      links.put("hazards", "Proportional hazards");
    }
    if (Evidence.hasDraws(result)) {
      links.put("draws", "Draws");
    }
    links.put("coverage", "Coverage");
    links.put("quantities", "Inferred quantities");
    links.put("cautions", "Cautions");
    Element list =
        Tags.add(body, "nav", "contents").attr("aria-label", "Sections").appendElement("ul");
    links.forEach(
        (id, text) -> Tags.text(list.appendElement("li"), "a", "", text).attr("href", "#" + id));
  }
}
