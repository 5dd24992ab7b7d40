package weighhouse.generator.layout;

import java.util.List;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Basis;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;
import weighhouse.generator.model.Measure;

/** Section titles carry the unit; rows only say what happens. */
final class SectionUnitInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Inputs").at(0, 0);
    plain(draft, sheet, Section.GENERAL);
    for (Basis basis : Basis.values()) {
      List<Event> events =
          draft.model().events().stream().filter(it -> it.form().basis() == basis).toList();
      if (!events.isEmpty() && !basis.alongCycles()) {
        sheet.label(draft.words().of("base." + basis.name(), "events").replace(" of events", "s"));
        sheet.down();
        events.forEach(event -> row(draft, sheet, event.symbol("base"), event.label()));
        sheet.down();
      }
    }
    curves(draft, sheet);
    for (Measure measure : Measure.values()) {
      effects(draft, sheet, measure);
    }
    plain(draft, sheet, Section.COSTS);
    plain(draft, sheet, Section.UTILITIES);
  }

  private static void curves(ModelDraft draft, SheetDraft sheet) {
    draft.model().inputs().stream()
        .filter(input -> input.section() == Section.CLINICAL && !input.symbol().endsWith(".base"))
        .forEach(input -> Inputs.live(sheet.label(input.label()), input).down());
  }

  private static void effects(ModelDraft draft, SheetDraft sheet, Measure measure) {
    List<Input> inputs =
        Inputs.of(draft.model(), Section.EFFECTS).stream()
            .filter(input -> input.ratio().measure() == measure)
            .toList();
    if (inputs.isEmpty()) {
      return;
    }
    sheet.label(inputs.get(0).label()).down();
    sheet.label("").labels("Estimate", "LCL", "UCL").down();
    for (Input input : inputs) {
      Event event = draft.model().event(input.symbol().replaceAll("\\..*", ""));
      boolean generic = inputs.size() > 1;
      Inputs.live(sheet.label(generic ? input.label() : event.label()), input);
      Inputs.limits(sheet, input).down();
    }
    sheet.down();
  }

  private static void row(ModelDraft draft, SheetDraft sheet, String symbol, String label) {
    draft.model().inputs().stream()
        .filter(input -> input.symbol().equals(symbol))
        .forEach(input -> Inputs.live(sheet.label(label), input).down());
  }

  private static void plain(ModelDraft draft, SheetDraft sheet, Section section) {
    sheet.label(Inputs.title(draft.words(), section)).down();
    for (Input input : Inputs.of(draft.model(), section)) {
      Inputs.live(sheet.label(input.label()), input).down();
    }
    sheet.down();
  }
}
