package weighhouse.report.html;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.jsoup.nodes.Element;
import weighhouse.audit.Finding;
import weighhouse.audit.Severity;
import weighhouse.report.text.Visible;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/**
 * Choice of findings by severity, family and sheet. The page's script shows it; without the script
 * it stays hidden and all findings show.
 */
final class Filter {
  private Filter() {}

  static void write(List<Finding> findings, Workbook workbook, Element section) {
    Element form =
        Tags.add(section, "form", "filter")
            .attr("id", "filter")
            .attr("hidden", "")
            .attr("aria-label", "Filter the findings");
    severities(findings, form);
    Set<String> families =
        findings.stream()
            .map(f -> Visible.text(f.rule().family()))
            .collect(Collectors.toCollection(TreeSet::new));
    choice(form, "family", "Family", families);
    Set<String> sheets = new LinkedHashSet<>();
    findings.forEach(finding -> sheets.addAll(sheets(finding, workbook)));
    choice(form, "sheet", "Sheet", sheets);
    Tags.add(form, "p", "shown").attr("role", "status").attr("id", "shown");
  }

  /** Tells the script what it filters by. */
  static void mark(Element element, Finding finding, Workbook workbook) {
    element
        .attr("data-severity", finding.severity().text())
        .attr("data-family", Visible.text(finding.rule().family()))
        .attr("data-sheets", String.join("\n", sheets(finding, workbook)));
  }

  private static Set<String> sheets(Finding finding, Workbook workbook) {
    Set<String> sheets = new LinkedHashSet<>();
    for (CellRange range : finding.cells()) {
      sheets.add(Visible.text(workbook.sheet(range.sheet()).name()));
    }
    return sheets;
  }

  private static void severities(List<Finding> findings, Element form) {
    Element group = form.appendElement("fieldset");
    Tags.text(group, "legend", "", "Severity");
    for (Severity severity : Severity.values()) {
      long count = findings.stream().filter(f -> f.severity() == severity).count();
      if (count > 0) {
        Element label = group.appendElement("label");
        label
            .appendElement("input")
            .attr("type", "checkbox")
            .attr("name", "severity")
            .attr("value", severity.text())
            .attr("checked", "");
        label.appendText(" " + Tags.capital(severity.text()) + " (" + count + ")");
      }
    }
  }

  private static void choice(Element form, String name, String text, Set<String> options) {
    Element label = form.appendElement("label");
    label.appendText(text + " ");
    Element select = label.appendElement("select").attr("name", name);
    Tags.text(select, "option", "", "all").attr("value", "");
    for (String option : options) {
      Tags.text(select, "option", "", shown(name, option)).attr("value", option);
    }
  }

  private static String shown(String name, String option) {
    return name.equals("family") ? option.toLowerCase(Locale.ROOT) : option;
  }
}
