package weighhouse.generator.layout;

import java.util.List;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;

/**
 * Effects under a heading some rows above; the row's own label is a sentence that never says what
 * kind of number stands beside it.
 */
final class HeadingAboveInputs implements Placement {
  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Parameters and sources").at(0, 0);
    for (Section section : List.of(Section.GENERAL, Section.CLINICAL)) {
      plain(draft, sheet, section);
    }
    sheet.label(Inputs.title(draft.words(), Section.EFFECTS)).down(2);
    for (Input input : Inputs.of(draft.model(), Section.EFFECTS)) {
      Event event = draft.model().event(input.symbol().replaceAll("\\..*", ""));
      sheet.skip(1).label(heading(input)).label("95% CI").down();
      sheet.skip(1).label("estimate").labels("from", "to").down(2);
      sheet.label(sentence(draft, event));
      Inputs.live(sheet, input);
      Inputs.limits(sheet, input).down(2);
    }
    plain(draft, sheet, Section.COSTS);
    plain(draft, sheet, Section.UTILITIES);
  }

  private static String heading(Input input) {
    String kind =
        input.ratio().measure().name().replace('_', ' ').toLowerCase(java.util.Locale.ROOT);
    return switch (input.ratio().measure()) {
      case RISK_RATIO, ODDS_RATIO -> kind + " at 1 year";
      case INVERSE_HAZARD_RATIO -> "hazard ratio, comparator against treatment";
      case HAZARD_REDUCTION -> "reduction in hazard";
      default -> kind;
    };
  }

  private static String sentence(ModelDraft draft, Event event) {
    return event.key().equals("die")
        ? "Patients compared with people of the same age and sex, all causes"
        : "%s changes the course to %s compared with %s"
            .formatted(draft.words().arm(1), event.label(), draft.words().arm(0));
  }

  private static void plain(ModelDraft draft, SheetDraft sheet, Section section) {
    sheet.label(Inputs.title(draft.words(), section)).down();
    for (Input input : Inputs.of(draft.model(), section)) {
      Inputs.live(sheet.label(input.label()), input).label(input.unit()).down();
    }
    sheet.down();
  }
}
