package weighhouse.generator.layout;

import java.util.List;
import weighhouse.generator.book.Book;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/** Inputs as a structured table; formulas index its column. */
final class TableInputs implements Placement {
  private static final List<String> HEADINGS =
      List.of("Parameter", "Description", "Estimate", "Lower", "Upper");

  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Inputs").at(2, 1);
    CellAt first = new CellAt(sheet.name(), sheet.row(), 1);
    HEADINGS.forEach(sheet::label);
    sheet.down();
    int row = 0;
    for (Section section : Section.values()) {
      for (Input input : Inputs.of(draft.model(), section)) {
        Inputs.live(sheet.label(input.name()).label(input.label()), input);
        Inputs.limits(sheet, input).down();
        row++;
        draft.book().symbols().text(input.symbol(), "INDEX(tblInputs[Estimate]," + row + ")");
      }
    }
    draft.book().table(new Book.Table("tblInputs", first, row, HEADINGS));
  }
}
