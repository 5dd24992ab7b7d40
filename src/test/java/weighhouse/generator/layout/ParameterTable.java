package weighhouse.generator.layout;

import java.util.stream.Stream;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.Step;

/** Calculated probabilities of constant events: a row a step, a column an arm. */
final class ParameterTable implements Placement {
  private final String sheetKey;
  private final int row;
  private final int column;

  /** On a sheet of its own. */
  ParameterTable() {
    this("parameters", 0, 0);
  }

  /** On a sheet (key or name) from a cell on. */
  ParameterTable(String sheetKey, int row, int column) {
    this.sheetKey = sheetKey;
    this.row = row;
    this.column = column;
  }

  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet(draft.words().of(sheetKey)).at(row, column);
    sheet.label("").labels(draft.words().arm(0), draft.words().arm(1)).down();
    for (Event event : draft.model().events()) {
      event.form().before().forEach(step -> row(draft, sheet, event, step, true, false));
      boolean both = event.inBothArms();
      event.form().applied().forEach(step -> row(draft, sheet, event, step, both, true));
    }
  }

  private static void row(
      ModelDraft draft, SheetDraft sheet, Event event, Step step, boolean first, boolean second) {
    if (event.form().basis().alongCycles() && !step.isScalar()) {
      return;
    }
    sheet.label(draft.words().of("step." + step.name(), event.label()));
    for (int arm : Stream.of(first ? 0 : -1, second ? 1 : -1).toList()) {
      if (arm < 0) {
        sheet.skip(1);
      } else {
        draft.scalar(sheet, event, step, arm);
      }
    }
    sheet.down();
  }
}
