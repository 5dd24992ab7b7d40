package weighhouse.generator.layout;

import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/** Inputs at the left of the one sheet that holds the whole model. */
final class OneSheetInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Model").at(0, 0);
    sheet.label(draft.words().versus()).down(2);
    for (Section section : Section.values()) {
      sheet.label(Inputs.title(draft.words(), section)).down();
      for (Input input : Inputs.of(draft.model(), section)) {
        Inputs.live(sheet.label(input.label()), input).label(input.unit());
        Inputs.limits(sheet, input).down();
      }
      sheet.down();
    }
  }
}
