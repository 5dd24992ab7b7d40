package weighhouse.generator.layout;

import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/** Formulas fetch inputs by their description, INDEX over MATCH with a literal. */
final class IndexMatchInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Assumptions").at(1, 0);
    sheet.labels("Assumption", "Value", "Lower", "Upper").down();
    int first = sheet.row();
    for (Section section : Section.values()) {
      for (Input input : Inputs.of(draft.model(), section)) {
        Inputs.live(sheet.label(input.label()), input);
        Inputs.limits(sheet, input).down();
      }
    }
    int last = sheet.row() - 1;
    String name = CellAt.quoted(sheet.name());
    for (Input input : draft.model().inputs()) {
      String fetch =
          "INDEX(%1$s!$B$%2$d:$B$%3$d,MATCH(\"%4$s\",%1$s!$A$%2$d:$A$%3$d,0))"
              .formatted(name, first + 1, last + 1, input.label());
      draft.book().symbols().text(input.symbol(), fetch);
    }
  }
}
