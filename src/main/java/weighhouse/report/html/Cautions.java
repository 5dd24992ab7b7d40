package weighhouse.report.html;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.AuditResult;

/** What the reader must not take the report for, and which file it speaks of. */
final class Cautions {
  private static final List<String> SENTENCES =
      List.of(
          "Every finding needs a qualified reviewer: a formula can be right for a reason that the "
              + "workbook does not tell.",
          "Where the guidance of the agency that receives the model says otherwise, that guidance "
              + "rules.",
          "A pass says that nothing was found in what was analysed. It does not say that the model, "
              + "its structure or its evidence are sound.",
          "Quantities are inferred from labels and formulas. Where one is wrong, findings that rest "
              + "on it are wrong too; declare it in a brief.",
          "Corrected values come from this program's own recalculation. Check them in the "
              + "spreadsheet before they are used.",
          "Macros were not run and links to other files were not followed. The audited file was not "
              + "changed.");

  private Cautions() {}

  static void write(Element main) {
    Element section = Tags.section(main, "cautions", "Cautions");
    Element list = Tags.add(section, "ul", "sentences");
    SENTENCES.forEach(sentence -> Tags.text(list, "li", "", sentence));
  }

  static void imprint(AuditResult result, Element body) {
    Element footer = body.appendElement("footer");
    Element line = footer.appendElement("p");
    line.appendText("Audit of ");
    Tags.text(line, "b", "", result.workbook().fileName());
    line.appendText(", SHA-256 ");
    Tags.text(line, "code", "", result.workbook().sha256());
  }
}
