package weighhouse.generator.layout;

import java.util.List;
import weighhouse.generator.book.SheetDraft;

/** Totals by arm, increments, ICER and net benefit. */
final class ResultsSheet implements Placement {
  private static final List<String> TOTALS = List.of("cost", "qaly", "ly");

  private final String sheetKey;
  private final int row;
  private final int column;

  ResultsSheet() {
    this("results", 0, 0);
  }

  ResultsSheet(String sheetKey, int row, int column) {
    this.sheetKey = sheetKey;
    this.row = row;
    this.column = column;
  }

  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet(draft.words().of(sheetKey)).at(row, column);
    sheet.label(draft.words().versus()).down(2);
    sheet.label("").labels(draft.words().arm(0), draft.words().arm(1)).down();
    for (String total : TOTALS) {
      sheet.label(draft.words().of("out." + total));
      for (int arm = 0; arm < 2; arm++) {
        sheet.formula("SUM({line.d" + total + "." + arm + "})").as("out." + total + "." + arm);
        draft.outcomes().put(total + "." + draft.words().arm(arm), sheet.last());
      }
      sheet.down();
    }
    sheet.down();
    outcome(draft, sheet, "dcost", "{out.cost.1}-{out.cost.0}");
    outcome(draft, sheet, "dqaly", "{out.qaly.1}-{out.qaly.0}");
    outcome(draft, sheet, "icer", "{out.dcost}/{out.dqaly}");
    outcome(draft, sheet, "nb", "{out.dqaly}*{wtp}-{out.dcost}");
  }

  private static void outcome(ModelDraft draft, SheetDraft sheet, String key, String formula) {
    sheet.label(draft.words().of("out." + key)).formula(formula).as("out." + key);
    draft.outcomes().put(key, sheet.last());
    sheet.down();
  }
}
