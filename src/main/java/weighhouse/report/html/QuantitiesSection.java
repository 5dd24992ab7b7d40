package weighhouse.report.html;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;
import weighhouse.audit.QuantityRow;

/** What each range was taken for, and why; a search field where the script runs. */
final class QuantitiesSection {
  private static final int MOST_ROWS = 3000;

  private QuantitiesSection() {}

  static void write(AuditResult result, Element main) {
    Element section = Tags.section(main, "quantities", "Inferred quantities");
    List<QuantityRow> rows = result.quantities();
    String cycle = result.cycle() == null ? "not told by the workbook" : result.cycle();
    Tags.text(
        section,
        "p",
        "lead",
        "Cycle length: "
            + cycle
            + ". "
            + Tags.count(rows.size(), "range")
            + " with a known quantity. Where one is wrong, declare it in a brief and audit again.");
    if (rows.isEmpty()) {
      return;
    }
    Element details = Tags.details(section, "Show the quantities and their evidence");
    Element label = Tags.add(details, "label", "search").attr("hidden", "");
    label.appendText("Search ");
    label.appendElement("input").attr("type", "search").attr("id", "search");
    Tags.add(details, "p", "shown").attr("role", "status").attr("id", "found");
    Element body =
        Tags.table(
            details,
            "Quantities and what they rest on",
            List.of("Range", "Label", "Quantity", "Basis", "Evidence"));
    body.attr("id", "quantity-rows");
    rows.stream().limit(MOST_ROWS).forEach(row -> row(row, result, body));
    if (rows.size() > MOST_ROWS) {
      Tags.text(details, "p", "", (rows.size() - MOST_ROWS) + " more are in the JSON report.");
    }
  }

  private static void row(QuantityRow quantity, AuditResult result, Element body) {
    Element row = body.appendElement("tr");
    Element head = row.appendElement("th").attr("scope", "row");
    Tags.text(head, "code", "", result.workbook().show(quantity.range()));
    Tags.text(row, "td", "", quantity.label());
    String span = quantity.span() == null ? "" : ", " + quantity.span();
    Tags.text(row, "td", "", quantity.kind() + span);
    Tags.text(row, "td", "", quantity.basis());
    Tags.text(row, "td", "", String.join("; ", quantity.evidence()));
  }
}
