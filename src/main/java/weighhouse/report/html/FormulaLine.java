package weighhouse.report.html;

import org.jsoup.nodes.Element;
import weighhouse.formula.SourceSpan;
import weighhouse.report.text.Visible;

/** A formula as Excel shows it, with its wrong part marked. */
final class FormulaLine {
  private FormulaLine() {}

  static void write(Element parent, String formula, SourceSpan offending) {
    Element code = Tags.add(parent, "code", "formula");
    if (offending == null || outside(offending, formula)) {
      code.text(Visible.text(formula));
      return;
    }
    code.appendText(Visible.text(formula.substring(0, offending.start())));
    Tags.text(code, "mark", "", formula.substring(offending.start(), offending.end()));
    code.appendText(Visible.text(formula.substring(offending.end())));
  }

  private static boolean outside(SourceSpan span, String formula) {
    return span.start() < 0 || span.end() > formula.length() || span.start() >= span.end();
  }
}
