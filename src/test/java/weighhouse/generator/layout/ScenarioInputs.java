package weighhouse.generator.layout;

import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/** Base, low and high scenario side by side; a live column picks one by CHOOSE or INDEX. */
final class ScenarioInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Scenarios").at(0, 0);
    boolean index = draft.dice().chance(0.5);
    sheet.label("Scenario (1 base, 2 low, 3 high)").value(1).as("scn").down(2);
    sheet.labels("Parameter", "Live", "Base", "Low", "High").down();
    for (Section section : Section.values()) {
      sheet.label(Inputs.title(draft.words(), section)).down();
      for (Input input : Inputs.of(draft.model(), section)) {
        row(sheet, input, index);
      }
    }
  }

  private static void row(SheetDraft sheet, Input input, boolean index) {
    int row = sheet.row() + 1;
    String pick =
        index
            ? "INDEX(C%1$d:E%1$d,1,{scn})".formatted(row)
            : "CHOOSE({scn},C%1$d,D%1$d,E%1$d)".formatted(row);
    sheet.label(input.label()).formula(pick).as(input.symbol());
    Inputs.value(sheet, input);
    if (input.ratio() != null) {
      Inputs.limits(sheet, input);
    } else {
      double swing = input.section() == Section.GENERAL ? 0 : 0.1;
      sheet.value(input.value() * (1 - swing)).value(input.value() * (1 + swing));
    }
    sheet.down();
  }
}
