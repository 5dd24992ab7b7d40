package weighhouse.report.html;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.ActsOn;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Measure;
import weighhouse.report.plot.Beam;
import weighhouse.report.plot.Spark;
import weighhouse.report.text.Numbers;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/** The measures of the workbook: what was entered and what the model delivers. */
final class Ledger {
  /** Larger relative differences are called out. */
  private static final double NOTICEABLE = 0.002;

  private static final int MOST_RANGES = 6;

  private Ledger() {}

  static void write(AuditResult result, Element main) {
    Element section = Tags.section(main, "measures", "Ledger of effect measures");
    if (result.measures().isEmpty()) {
      Tags.text(section, "p", "", "No effect measure was found in the workbook.");
      return;
    }
    Tags.text(
        section,
        "p",
        "lead",
        "On each beam the entered ratio hangs from above, with its interval; what the model "
            + "delivers, from the smallest to the largest cycle, lies below.");
    Element list = Tags.add(section, "ul", "ledger");
    result.measures().forEach(measure -> entry(list, measure, result.workbook()));
  }

  private static void entry(Element list, Measure measure, Workbook workbook) {
    Element item = list.appendElement("li");
    Element name = Tags.add(item, "div", "name");
    Tags.text(name, "h3", "", named(measure, workbook));
    Element where = Tags.add(name, "p", "where");
    Tags.text(where, "code", "", workbook.show(measure.cell()));
    where.appendText(" · " + measure.kind().text());
    Element figures = Tags.add(item, "dl", "figures");
    figure(figures, "Entered", entered(measure), "");
    figure(figures, "Effective", effective(measure), differs(measure) ? "differs" : "");
    figure(figures, "Acts on", actsOn(measure), "");
    Element drawing = Tags.add(item, "div", "drawing");
    Beam.draw(drawing, measure);
    Spark.draw(drawing, measure.series(), measure.value());
    reaches(item, measure.reaches(), workbook);
  }

  static String named(Measure measure, Workbook workbook) {
    return measure.label().isBlank() ? workbook.show(measure.cell()) : measure.label();
  }

  private static void figure(Element list, String term, String text, String css) {
    Element pair = list.appendElement("div");
    Tags.text(pair, "dt", "", term);
    Tags.text(pair, "dd", css, text);
  }

  private static String entered(Measure measure) {
    String value = Numbers.show(measure.value());
    boolean interval = !Double.isNaN(measure.lower()) && !Double.isNaN(measure.upper());
    return interval
        ? value
            + " ("
            + Numbers.show(measure.lower())
            + " to "
            + Numbers.show(measure.upper())
            + ")"
        : value;
  }

  static String effective(Measure measure) {
    Measure.Effective effective = measure.effective();
    if (effective == null) {
      return "not measured";
    }
    String least = Numbers.show(effective.min());
    String most = Numbers.show(effective.max());
    return least.equals(most) ? least : least + " to " + most;
  }

  private static boolean differs(Measure measure) {
    Measure.Effective effective = measure.effective();
    return effective != null
        && (far(effective.min(), measure.value()) || far(effective.max(), measure.value()));
  }

  private static boolean far(double one, double other) {
    return Math.abs(one - other) > NOTICEABLE * Math.abs(other);
  }

  private static String actsOn(Measure measure) {
    return measure.actsOn() == ActsOn.MIXED ? "several scales" : measure.actsOn().text();
  }

  private static void reaches(Element item, List<CellRange> ranges, Workbook workbook) {
    if (ranges.isEmpty()) {
      return;
    }
    Element line = Tags.add(item, "p", "reaches");
    line.appendText("Reaches ");
    for (CellRange range : ranges.subList(0, Math.min(MOST_RANGES, ranges.size()))) {
      Tags.text(line, "code", "", workbook.show(range));
      line.appendText(" ");
    }
    if (ranges.size() > MOST_RANGES) {
      line.appendText("and " + (ranges.size() - MOST_RANGES) + " more");
    }
  }
}
