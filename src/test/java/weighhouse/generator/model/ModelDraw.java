package weighhouse.generator.model;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import weighhouse.generator.model.EventForm.Trait;

/** Draws a model around the faults that it shall hold. */
public final class ModelDraw {
  private final Dice dice;
  private final Scenario scenario;
  private final CycleUnit unit;
  private final List<EventForm> rightForms;
  private final boolean alongCycles;
  private final ModelParts parts;

  private ModelDraw(Dice dice, Frame frame, List<EventForm> wanted, List<EventForm> rightForms) {
    this.dice = dice;
    this.rightForms = rightForms;
    this.alongCycles = frame.alongCycles();
    scenario = Scenario.draw(dice, frame.languages());
    unit = dice.pick(units(wanted));
    parts = new ModelParts(dice, scenario, unit, dice.pick(cycleInputs(frame, wanted)));
  }

  /** What a layout lets a model be. */
  public record Frame(List<String> languages, List<CycleInput> cycleInputs, boolean alongCycles) {}

  /**
   * A model with one event for each wanted form and right forms for all other events.
   *
   * @param wanted forms with faults that go together, see {@link #goTogether}
   */
  public static Model draw(
      Dice dice, Frame frame, List<EventForm> wanted, List<EventForm> rightForms) {
    return new ModelDraw(dice, frame, wanted, rightForms).model(wanted);
  }

  /** Whether one model can hold all the forms. */
  public static boolean goTogether(List<EventForm> forms) {
    boolean years = forms.stream().anyMatch(form -> form.has(Trait.YEAR_CYCLE));
    boolean parts = forms.stream().anyMatch(form -> form.has(Trait.SHORT_CYCLE));
    long deaths = forms.stream().filter(form -> form.has(Trait.DEATH)).count();
    return !(years && parts) && deaths <= 1 && forms.size() - deaths <= 2;
  }

  private static List<CycleUnit> units(List<EventForm> wanted) {
    if (wanted.stream().anyMatch(form -> form.has(Trait.YEAR_CYCLE))) {
      return List.of(CycleUnit.YEAR);
    }
    List<CycleUnit> all = new ArrayList<>(List.of(CycleUnit.values()));
    if (wanted.stream().anyMatch(form -> form.has(Trait.SHORT_CYCLE))) {
      all.remove(CycleUnit.YEAR);
    }
    return all;
  }

  private List<CycleInput> cycleInputs(Frame frame, List<EventForm> wanted) {
    Predicate<CycleInput> suits =
        input ->
            (input != CycleInput.MONTHS || unit == CycleUnit.MONTH || unit == CycleUnit.QUARTER)
                && (input != CycleInput.ABSENT
                    || wanted.stream().noneMatch(form -> form.has(Trait.CYCLE_IN_CELL)));
    List<CycleInput> suiting = frame.cycleInputs().stream().filter(suits).toList();
    return suiting.isEmpty() ? List.of(CycleInput.YEARS) : suiting;
  }

  private Model model(List<EventForm> wanted) {
    List<EventForm> open = new ArrayList<>(wanted);
    open.removeIf(form -> form.has(Trait.DEATH));
    for (int from = 0; from + 1 < scenario.living().size(); from++) {
      String label = scenario.progressions().get(from);
      EventForm form = open.isEmpty() ? right(false, from == 0) : open.remove(0);
      parts.add("prog" + (from + 1), label, from, from + 1, form, dice.between(0.08, 0.32, 3));
    }
    if (!open.isEmpty() || dice.chance(0.3)) {
      EventForm form = open.isEmpty() ? right(false, false) : open.remove(0);
      parts.add("hosp", parts.hospital(), Event.ANY, Event.ANY, form, dice.between(0.1, 0.4, 3));
    }
    EventForm death =
        wanted.stream()
            .filter(form -> form.has(Trait.DEATH))
            .findFirst()
            .orElseGet(() -> right(true, false));
    parts.add("die", scenario.words().of("death"), Event.ANY, scenario.dead(), death, mortality());
    int cycles = unit == CycleUnit.YEAR ? dice.between(25, 45) : dice.between(30, 80);
    return parts.model(cycles);
  }

  private double mortality() {
    return dice.between(0.015, 0.05, 4);
  }

  private EventForm right(boolean death, boolean withEffect) {
    Predicate<EventForm> suits =
        form ->
            (alongCycles || !form.basis().alongCycles())
                && (!withEffect || form.measure() != null)
                && (death ? suitsDeath(form) : !form.has(Trait.DEATH));
    return dice.pick(rightForms.stream().filter(suits).toList());
  }

  private static boolean suitsDeath(EventForm form) {
    return form.has(Trait.DEATH) || (form.measure() == null && form.basis() != Basis.MEDIAN_YEARS);
  }
}
