package weighhouse.report.html;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Coverage;
import weighhouse.report.text.Numbers;
import weighhouse.workbook.Workbook;

/** What was and was not analysed, and whether the workbook's own values were reproduced. */
final class CoverageSection {
  private static final int MOST_ROWS = 200;

  private CoverageSection() {}

  static void write(AuditResult result, Element main) {
    Element section = Tags.section(main, "coverage", "Coverage and reproduction");
    Coverage coverage = result.coverage();
    counts(coverage, section);
    notReproduced(coverage.notReproduced(), result.workbook(), section);
    unsupported(coverage.unsupported(), section);
    Tags.sentences(section, "Not analysed: macros", coverage.macros());
    Tags.sentences(section, "Not followed: links to other workbooks", coverage.externalLinks());
    Tags.sentences(section, "Hidden, and analysed all the same", coverage.hidden());
    Tags.sentences(section, "Problems", coverage.problems());
  }

  private static void counts(Coverage coverage, Element section) {
    Element body = Tags.table(section, "Formula cells", List.of("What", "Cells", "Share"));
    int all = coverage.formulaCells();
    Tags.row(body, "Formula cells", numbers(all, all));
    Tags.row(body, "Formula read", numbers(coverage.read(), all));
    Tags.row(body, "Recalculated", numbers(coverage.recalculated(), all));
    Tags.row(
        body,
        "Reproduced (of those recalculated)",
        numbers(coverage.reproduced(), coverage.recalculated()));
    Tags.row(body, "Not analysed", numbers(all - coverage.recalculated(), all));
  }

  private static List<String> numbers(int part, int whole) {
    String share = whole == 0 ? "–" : percent(part, whole) + " %";
    return List.of(Numbers.show(part), share);
  }

  /** Never 100 while a cell is missing. */
  private static String percent(int part, int whole) {
    double percent = Math.floor(1000.0 * part / whole) / 10;
    return Numbers.show(percent);
  }

  private static void notReproduced(
      List<Coverage.Difference> differences, Workbook workbook, Element section) {
    if (differences.isEmpty()) {
      return;
    }
    Element body =
        Tags.table(
            section,
            "Not reproduced: findings that rest on these cells are less certain",
            List.of("Cell", "Stored", "Recalculated", "Change"));
    for (Coverage.Difference d : differences.subList(0, Math.min(MOST_ROWS, differences.size()))) {
      Element row = Tags.row(body, "", OutcomeTable.numbers(d.stored(), d.recalculated()));
      Tags.text(row.child(0), "code", "", workbook.show(d.cell()));
    }
    rest(differences.size(), section);
  }

  private static void unsupported(Map<String, Integer> unsupported, Element section) {
    List<String> sentences = new ArrayList<>();
    unsupported.forEach(
        (reason, cells) -> sentences.add(reason + ": " + Tags.count(cells, "cell")));
    Tags.sentences(section, "Not recalculated; stored values used", sentences);
  }

  private static void rest(int size, Element section) {
    if (size > MOST_ROWS) {
      Tags.text(section, "p", "", (size - MOST_ROWS) + " more are in the JSON report.");
    }
  }
}
