package weighhouse.generator.layout;

import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;
import weighhouse.generator.model.Ratio;

/**
 * name | live | drawn | fixed | SE | distribution | a | b | description, so that the words stand
 * seven columns right of the value; a switch chooses between fixed and drawn.
 */
final class LabelRightInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Params").at(0, 0);
    sheet.label("Probabilistic analysis (1 = on)").value(0).as("sw").down(2);
    sheet
        .labels("name", "live", "drawn", "fixed", "SE", "distribution", "a", "b", "description")
        .down();
    for (Section section : Section.values()) {
      sheet.down().label("").skip(7).label(Inputs.title(draft.words(), section)).down();
      for (Input input : Inputs.of(draft.model(), section)) {
        row(sheet, input);
      }
    }
  }

  private static void row(SheetDraft sheet, Input input) {
    int row = sheet.row() + 1;
    sheet.label(input.name().replace("prog", "p"));
    if (input.ratio() == null) {
      Inputs.live(sheet, input).skip(1);
      sheet.skip(5);
    } else {
      sheet.formula("IF({sw}=0,D" + row + ",C" + row + ")").as(input.symbol());
      drawn(sheet, input.ratio(), row);
    }
    sheet.label(input.label()).down();
  }

  private static void drawn(SheetDraft sheet, Ratio ratio, int row) {
    if (ratio.measure().isRatio()) {
      sheet
          .formula("EXP(NORMINV(RAND(),G" + row + ",H" + row + "))")
          .value(ratio.value())
          .value(ratio.standardError())
          .label("log-normal")
          .formula("LN(D" + row + ")")
          .formula("E" + row);
    } else {
      sheet
          .formula("NORMINV(RAND(),G" + row + ",H" + row + ")")
          .value(ratio.value())
          .value(ratio.standardError())
          .label("normal")
          .formula("D" + row)
          .formula("E" + row);
    }
  }
}
