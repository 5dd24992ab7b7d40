package weighhouse.generator.layout;

import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/** Values in the first column, what they are to their right, two to five columns away. */
final class ValueFirstInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Values").at(0, 0);
    int gap = draft.dice().between(0, 3);
    for (Section section : Section.values()) {
      sheet.skip(3 + gap).label(Inputs.title(draft.words(), section)).down();
      for (Input input : Inputs.of(draft.model(), section)) {
        Inputs.live(sheet, input);
        Inputs.limits(sheet, input).skip(gap).label(input.label()).down();
      }
      sheet.down();
    }
  }
}
