package weighhouse.generator.layout;

import java.util.List;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;
import weighhouse.generator.model.Model;
import weighhouse.generator.model.Words;

/** What the input placements share. */
final class Inputs {
  private Inputs() {}

  static List<Input> of(Model model, Section section) {
    return model.inputs().stream().filter(input -> input.section() == section).toList();
  }

  /** Writes the value (or what is typed for it) and registers it. */
  static SheetDraft live(SheetDraft sheet, Input input) {
    return value(sheet, input).as(input.symbol());
  }

  /** Writes the value without registering it. */
  static SheetDraft value(SheetDraft sheet, Input input) {
    return input.formula() == null
        ? sheet.value(input.value(), input.format())
        : sheet.formula(input.formula());
  }

  static String title(Words words, Section section) {
    return words.of(section.name().toLowerCase(java.util.Locale.ROOT));
  }

  /** Lower and upper limits where the input has them. */
  static SheetDraft limits(SheetDraft sheet, Input input) {
    return input.ratio() == null
        ? sheet.skip(2)
        : sheet
            .value(input.ratio().lower(), input.format())
            .value(input.ratio().upper(), input.format());
  }
}
