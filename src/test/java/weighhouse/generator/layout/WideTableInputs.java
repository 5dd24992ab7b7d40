package weighhouse.generator.layout;

import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;
import weighhouse.generator.model.Measure;

/** name | description | base | lower | upper | unit | distribution | source. */
final class WideTableInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Model inputs").at(1, 1);
    sheet.label("Model inputs: " + draft.words().versus()).down(2);
    sheet
        .labels("Name", "Description", "Base case", "Lower", "Upper", "Unit", "Distribution")
        .label("Source")
        .down();
    for (Section section : Section.values()) {
      for (Input input : Inputs.of(draft.model(), section)) {
        row(sheet, input);
      }
      sheet.down();
    }
  }

  private static void row(SheetDraft sheet, Input input) {
    Inputs.live(sheet.label(input.name()).label(input.label()), input);
    if (input.ratio() == null && input.formula() == null && input.section() != Section.GENERAL) {
      sheet.value(input.value() * 0.8).value(input.value() * 1.2);
    } else {
      Inputs.limits(sheet, input);
    }
    sheet.label(input.unit()).label(distribution(input)).label(source(input)).down();
  }

  private static String distribution(Input input) {
    if (input.ratio() != null) {
      return input.ratio().measure() == Measure.LOG_HAZARD_RATIO ? "Normal" : "Log-normal";
    }
    return switch (input.section()) {
      case GENERAL -> "Fixed";
      case COSTS -> "Gamma";
      default -> "Beta";
    };
  }

  private static String source(Input input) {
    return input.section() == Section.GENERAL ? "Assumption" : "Trial data (invented)";
  }
}
