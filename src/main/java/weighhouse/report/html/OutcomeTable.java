package weighhouse.report.html;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.Figure;
import weighhouse.audit.OutcomeFigures;
import weighhouse.report.text.Numbers;
import weighhouse.workbook.Workbook;

/** Outcomes now and corrected. */
final class OutcomeTable {
  private static final List<String> HEADS = List.of("Outcome", "Now", "Corrected", "Change");

  private OutcomeTable() {}

  static void write(
      Element parent, String caption, List<OutcomeFigures> outcomes, Workbook workbook) {
    Element body = Tags.table(parent, caption, HEADS);
    for (OutcomeFigures outcome : outcomes) {
      Element row = Tags.row(body, "", numbers(outcome.now(), outcome.corrected()));
      Element head = row.child(0);
      if (!outcome.label().isBlank()) {
        Tags.text(head, "span", "label", outcome.label());
        head.appendText(" ");
      }
      Tags.text(head, "code", "", workbook.show(outcome.cell()));
    }
  }

  /** Now, corrected and the change, in digits that tell them apart. */
  static List<String> numbers(Figure now, Figure corrected) {
    int digits = Numbers.digits(now, corrected);
    return List.of(
        Numbers.show(now, digits), Numbers.show(corrected, digits), Numbers.change(now, corrected));
  }
}
