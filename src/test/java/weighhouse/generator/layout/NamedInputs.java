package weighhouse.generator.layout;

import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/** Every input is a defined name; costs and utilities only at the scope of their sheet. */
final class NamedInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Data").at(1, 1);
    for (Section section : Section.values()) {
      sheet.label(Inputs.title(draft.words(), section)).down();
      for (Input input : Inputs.of(draft.model(), section)) {
        Inputs.live(sheet.label(input.label()), input);
        CellAt at = sheet.last();
        Inputs.limits(sheet, input).label(input.name()).down();
        name(draft, input, at);
      }
      sheet.down();
    }
  }

  private static void name(ModelDraft draft, Input input, CellAt at) {
    String name = name(input);
    String cell = at.from("");
    if (input.section() == Section.UTILITIES) {
      draft.book().nameOn(at.sheet(), name, cell);
    } else {
      draft.book().name(name, cell);
      draft.book().symbols().text(input.symbol(), name);
    }
  }

  private static String name(Input input) {
    if (input.ratio() != null) {
      String event = input.symbol().substring(0, input.symbol().indexOf('.'));
      String second = input.symbol().endsWith("R2") ? "_b" : "";
      return input.ratio().measure().prefix() + "_" + event + second;
    }
    return switch (input.symbol()) {
      case "cycle" -> "cycle_length";
      case "disc" -> "dr";
      default -> "n_" + input.name();
    };
  }
}
