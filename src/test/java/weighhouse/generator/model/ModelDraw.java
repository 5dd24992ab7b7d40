package weighhouse.generator.model;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import weighhouse.generator.model.EventForm.Trait;
import weighhouse.generator.model.Input.Section;

/** Draws a model around the faults that it shall hold. */
public final class ModelDraw {
  private final Dice dice;
  private final Scenario scenario;
  private final CycleUnit unit;
  private final CycleInput cycleInput;
  private final List<EventForm> rightForms;
  private final boolean alongCycles;
  private final List<Event> events = new ArrayList<>();
  private final List<Input> inputs = new ArrayList<>();

  private ModelDraw(Dice dice, Frame frame, List<EventForm> wanted, List<EventForm> rightForms) {
    this.dice = dice;
    this.rightForms = rightForms;
    this.alongCycles = frame.alongCycles();
    scenario = Scenario.draw(dice, frame.languages());
    unit = dice.pick(units(wanted));
    cycleInput = dice.pick(cycleInputs(frame, wanted));
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
    general();
    List<EventForm> open = new ArrayList<>(wanted);
    open.removeIf(form -> form.has(Trait.DEATH));
    for (int from = 0; from + 1 < scenario.living().size(); from++) {
      String label = scenario.progressions().get(from);
      EventForm form = open.isEmpty() ? right(false, from == 0) : open.remove(0);
      add("prog" + (from + 1), label, from, from + 1, form, dice.between(0.08, 0.32, 3));
    }
    if (!open.isEmpty() || dice.chance(0.3)) {
      EventForm form = open.isEmpty() ? right(false, false) : open.remove(0);
      add("hosp", hospital(), Event.ANY, Event.ANY, form, dice.between(0.1, 0.4, 3));
    }
    EventForm death =
        wanted.stream()
            .filter(form -> form.has(Trait.DEATH))
            .findFirst()
            .orElseGet(() -> right(true, false));
    add("die", scenario.words().of("death"), Event.ANY, scenario.dead(), death, mortality());
    values();
    int cycles = unit == CycleUnit.YEAR ? dice.between(25, 45) : dice.between(30, 80);
    return new Model(scenario, unit, cycleInput, cycles, events, inputs);
  }

  private double mortality() {
    return dice.between(0.015, 0.05, 4);
  }

  private String hospital() {
    return switch (scenario.words().language()) {
      case "es" -> "hospitalización";
      case "de" -> "Krankenhausaufnahme";
      case "fr" -> "hospitalisation";
      default -> "hospital admission";
    };
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

  private void add(String key, String label, int from, int to, EventForm form, double yearlyRate) {
    Map<String, Double> bases = bases(form, form.has(Trait.HIGH_BASE) ? 0.8 : yearlyRate);
    Ratio ratio = form.measure() == null ? null : Ratio.draw(form.measure(), dice);
    Ratio second = form.has(Trait.SECOND_RATIO) ? Ratio.draw(form.measure(), dice) : null;
    Event event = new Event(key, label, from, to, form, bases, ratio, second);
    events.add(event);
    Words words = scenario.words();
    bases.forEach(
        (name, value) -> {
          String word = "base." + (name.equals("base") ? form.basis().name() : name);
          inputs.add(
              Input.number(event.symbol(name), words.of(word, label), Section.CLINICAL, value));
        });
    if (ratio != null) {
      String text = words.measure(form.measure(), key, label, dice);
      inputs.add(Input.effect(event.symbol("R"), text, ratio));
    }
    if (second != null) {
      String text = words.measure(form.measure(), key + "_2", label + " (2)", dice);
      inputs.add(Input.effect(event.symbol("R2"), text, second));
    }
  }

  private Map<String, Double> bases(EventForm form, double rate) {
    Map<String, Double> bases = new LinkedHashMap<>();
    switch (form.basis()) {
      case ANNUAL_RATE -> bases.put("base", rate);
      case RATE_PER_1000 -> bases.put("base", Dice.round(rate * 1000, 0));
      case ANNUAL_PROBABILITY -> bases.put("base", over(rate, 1, 4));
      case FIVE_YEAR_PROBABILITY -> bases.put("base", over(rate, 5, 3));
      case MONTHLY_PROBABILITY -> bases.put("base", over(rate, 1 / 12.0, 5));
      case CYCLE_PROBABILITY -> bases.put("base", over(rate, unit.years(), 5));
      case MEDIAN_YEARS -> bases.put("base", Dice.round(Math.log(2) / rate, 2));
      case WEIBULL_HAZARD -> {
        bases.put("lambda", rate);
        bases.put("gamma", dice.between(1.1, 1.5, 2));
      }
      case LIFE_TABLE -> bases.clear();
      default -> throw new IllegalArgumentException(form.basis() + " is a curve");
    }
    return bases;
  }

  private static double over(double rate, double years, int digits) {
    return Dice.round(-Math.expm1(-rate * years), digits);
  }

  private void general() {
    Words words = scenario.words();
    cycle(words);
    inputs.add(
        Input.number(
                "disc",
                words.of("discount"),
                Section.GENERAL,
                dice.pick(List.of(0.03, 0.035, 0.04)))
            .shownAs("0.0%"));
    inputs.add(
        Input.number(
                "wtp",
                words.of("wtp"),
                Section.GENERAL,
                dice.pick(List.of(20000.0, 30000.0, 50000.0)))
            .shownAs("#,##0"));
    inputs.add(
        Input.number("age", words.of("age"), Section.GENERAL, dice.between(45, 65)).in("years"));
  }

  private void cycle(Words words) {
    switch (cycleInput) {
      case YEARS -> {
        Input input =
            Input.number("cycle", words.of("cycle.years"), Section.GENERAL, unit.years())
                .in("years");
        boolean typed = unit != CycleUnit.YEAR && dice.chance(0.6);
        inputs.add(typed ? input.typedAs(unit.yearsText()) : input);
      }
      case PER_YEAR ->
          inputs.add(
              Input.number(
                  "cycle",
                  words.of("cycle.perYear"),
                  Section.GENERAL,
                  Double.parseDouble(unit.perYearText())));
      case MONTHS ->
          inputs.add(
              Input.number(
                  "cycle",
                  words.of("cycle.months"),
                  Section.GENERAL,
                  unit == CycleUnit.MONTH ? 1 : 3));
      case ABSENT -> {}
    }
  }

  private void values() {
    Words words = scenario.words();
    for (int state = 0; state < scenario.living().size(); state++) {
      String name = scenario.living().get(state);
      double cost = 100.0 * dice.between(10 + 25 * state, 30 + 30 * state);
      double utility = Dice.round(0.86 - 0.13 * state - 0.01 * dice.between(0, 4), 2);
      inputs.add(
          Input.number("cost." + state, words.of("state.cost", name), Section.COSTS, cost)
              .shownAs("#,##0"));
      inputs.add(
          Input.number(
              "util." + state, words.of("state.utility", name), Section.UTILITIES, utility));
    }
    for (int arm = 0; arm < 2; arm++) {
      double cost = arm == 0 ? 100.0 * dice.between(2, 8) : 100.0 * dice.between(20, 60);
      inputs.add(
          Input.number("drug." + arm, words.of("drug.cost", words.arm(arm)), Section.COSTS, cost)
              .shownAs("#,##0"));
    }
    if (events.stream().anyMatch(event -> event.key().equals("hosp"))) {
      inputs.add(
          Input.number("cost.hosp", words.of("row.cost") + ", " + hospital(), Section.COSTS, 4200));
    }
  }
}
