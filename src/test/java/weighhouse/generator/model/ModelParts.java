package weighhouse.generator.model;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.generator.model.EventForm.Trait;
import weighhouse.generator.model.Input.Section;

/** Collects the events and inputs of a model under way. */
final class ModelParts {
  private final Dice dice;
  private final Scenario scenario;
  private final CycleUnit unit;
  private final CycleInput cycleInput;
  private final List<Event> events = new ArrayList<>();
  private final List<Input> inputs = new ArrayList<>();

  ModelParts(Dice dice, Scenario scenario, CycleUnit unit, CycleInput cycleInput) {
    this.dice = dice;
    this.scenario = scenario;
    this.unit = unit;
    this.cycleInput = cycleInput;
    general();
  }

  /** The model, once all events are added. */
  Model model(int cycles) {
    values();
    return new Model(scenario, unit, cycleInput, cycles, events, inputs);
  }

  /** What an admission is called. */
  String hospital() {
    return switch (scenario.words().language()) {
      case "es" -> "hospitalización";
      case "de" -> "Krankenhausaufnahme";
      case "fr" -> "hospitalisation";
      default -> "hospital admission";
    };
  }

  /** Adds an event and its inputs. */
  void add(String key, String label, int from, int to, EventForm form, double yearlyRate) {
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
      default -> bases.putAll(curve(form.basis(), rate));
    }
    return bases;
  }

  /** Parameters of a curve whose median is that of a constant rate. */
  private static Map<String, Double> curve(Basis basis, double rate) {
    double median = Math.log(2) / rate;
    double shape = 1.2;
    Map<String, Double> bases = new LinkedHashMap<>();
    switch (basis) {
      case WEIBULL_RATE -> {
        bases.put("lambda", Dice.round(Math.log(2) / Math.pow(median, shape), 4));
        bases.put("gamma", shape);
      }
      case WEIBULL_SCALE -> {
        bases.put("scale", Dice.round(median / Math.pow(Math.log(2), 1 / shape), 4));
        bases.put("shape", shape);
      }
      case EXPONENTIAL -> bases.put("lambda", Dice.round(rate, 4));
      case GOMPERTZ -> {
        bases.put("lambda", Dice.round(rate * 0.9, 4));
        bases.put("gamma", 0.08);
      }
      case LOG_NORMAL -> {
        bases.put("mu", Dice.round(Math.log(median), 4));
        bases.put("sigma", 0.85);
      }
      case LOG_LOGISTIC -> {
        bases.put("scale", Dice.round(median, 4));
        bases.put("shape", 1.5);
      }
      default -> throw new IllegalArgumentException(basis + " is no curve");
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
