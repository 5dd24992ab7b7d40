package weighhouse.generator.layout;

import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/** A table of keys; formulas fetch each input by VLOOKUP with its key. */
final class LookupInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Inputs").at(0, 0);
    sheet.label("Input table").down(2).labels("key", "description", "value", "low", "high").down();
    CellAt first = new CellAt(sheet.name(), sheet.row(), 0);
    for (Section section : Section.values()) {
      for (Input input : Inputs.of(draft.model(), section)) {
        Inputs.live(sheet.label(key(input)).label(input.label()), input);
        Inputs.limits(sheet, input).down();
      }
    }
    CellAt last = new CellAt(sheet.name(), sheet.row() - 1, 4);
    String table = first.from("") + ":" + CellAt.fixed(last.row(), last.column());
    draft.book().name("input_table", table);
    boolean named = draft.dice().chance(0.5);
    for (Input input : draft.model().inputs()) {
      String range = named ? "input_table" : table;
      draft
          .book()
          .symbols()
          .text(input.symbol(), "VLOOKUP(\"" + key(input) + "\"," + range + ",3,0)");
    }
  }

  private static String key(Input input) {
    if (input.ratio() == null) {
      return input.name();
    }
    return input.name().replaceAll("_R(2?)$", "$1") + "_" + input.ratio().measure().prefix();
  }
}
