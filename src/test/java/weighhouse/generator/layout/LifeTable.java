package weighhouse.generator.layout;

import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Basis;
import weighhouse.generator.model.Dice;

/** Invented annual probabilities of death by age, where an event needs them. */
final class LifeTable implements Placement {
  @Override
  public void place(ModelDraft draft) {
    if (draft.model().events().stream()
        .noneMatch(event -> event.form().basis() == Basis.LIFE_TABLE)) {
      return;
    }
    SheetDraft sheet = draft.book().sheet(draft.words().of("lifetable")).at(0, 0);
    sheet.label(draft.words().of("row.qx")).down(2);
    sheet.label(draft.words().of("row.age")).label("qx").down();
    int first = sheet.row() + 1;
    for (int age = 40; age <= 110; age++) {
      double qx = Math.min(0.6, 0.0015 * Math.exp(0.085 * (age - 40)));
      sheet.value(age).value(Dice.round(qx, 5)).down();
    }
    draft
        .book()
        .symbols()
        .text(
            "lifetable",
            weighhouse.generator.book.CellAt.quoted(sheet.name())
                + "!$A$"
                + first
                + ":$B$"
                + sheet.row());
  }
}
