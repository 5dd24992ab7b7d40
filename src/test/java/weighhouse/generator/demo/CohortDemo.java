package weighhouse.generator.demo;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.generator.model.Basis;
import weighhouse.generator.model.CycleInput;
import weighhouse.generator.model.CycleUnit;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.Input;
import weighhouse.generator.model.Input.Section;
import weighhouse.generator.model.Measure;
import weighhouse.generator.model.Model;
import weighhouse.generator.model.Ratio;
import weighhouse.generator.model.Scenario;
import weighhouse.generator.model.Step;
import weighhouse.generator.model.Words;

/** A monthly cohort model of an invented chronic condition, with eight faults or none. */
final class CohortDemo {
  private static final String RATIO_POWER = "1-(1-{p0})^{R}";
  private static final String OF_YEAR = "1-(1-{base})^{cyc}";
  private static final String ODDS = "{R}*{base}/(1-{base}+{R}*{base})";

  private final List<Event> events = new ArrayList<>();
  private final List<Input> inputs = new ArrayList<>();

  private CohortDemo() {}

  static Model model() {
    CohortDemo demo = new CohortDemo();
    demo.general();
    demo.states();
    demo.infections();
    demo.death();
    demo.values();
    Scenario scenario =
        new Scenario(
            new Words("en", "Usual care", "Treatment A"),
            List.of("flare", "severe disease"),
            List.of("Remission", "Active disease", "Severe disease"));
    return new Model(scenario, CycleUnit.MONTH, CycleInput.YEARS, 60, demo.events, demo.inputs);
  }

  private void general() {
    number("cycle", "Cycle length (years)", Section.GENERAL, 1 / 12.0, "years", "1/12");
    number("disc", "Discount rate (per year)", Section.GENERAL, 0.035, "per year", null);
    number("wtp", "Willingness to pay per QALY", Section.GENERAL, 20000, "currency", null);
    number("age", "Starting age", Section.GENERAL, 58, "years", null);
  }

  private void states() {
    event(
        new Event(
            "prog1",
            "flare",
            0,
            1,
            form(
                "hazard-ratio-times-probability",
                "one minus reduction",
                Measure.HAZARD_RATIO,
                Basis.ANNUAL_PROBABILITY,
                List.of(Step.of("p0", OF_YEAR)),
                Step.of("p", RATIO_POWER, "{p0}-{p0}*(1-{R})")),
            Map.of("base", 0.62),
            new Ratio(Measure.HAZARD_RATIO, 0.55, 0.4311, 0.7016, 0.1243),
            null),
        "Annual probability of flare",
        "HR (95% CI), flare");
    event(
        new Event(
            "prog2",
            "severe disease",
            1,
            2,
            form(
                "rate-used-as-probability",
                "rate times the cycle",
                Measure.HAZARD_RATIO,
                Basis.ANNUAL_RATE,
                List.of(Step.of("p0", "1-EXP(-{base}{xcyc})", "{base}{xcyc}")),
                Step.of("p", RATIO_POWER)),
            Map.of("base", 0.58),
            new Ratio(Measure.HAZARD_RATIO, 0.72, 0.5811, 0.8921, 0.1093),
            null),
        "Annual rate of progression to severe disease",
        "Hazard ratio, severe disease");
  }

  private void infections() {
    event(
        new Event(
            "inf",
            "serious infection",
            Event.ANY,
            Event.ANY,
            form(
                "probability-divided-by-cycles",
                "by the cycle",
                Measure.RATE_RATIO,
                Basis.ANNUAL_PROBABILITY,
                List.of(Step.of("p0", OF_YEAR, "{base}/12")),
                Step.of("p", RATIO_POWER)),
            Map.of("base", 0.27),
            new Ratio(Measure.RATE_RATIO, 1.31, 1.05, 1.6344, 0.1129),
            null),
        "Annual probability of serious infection",
        "Rate ratio, serious infection");
    event(
        new Event(
            "hosp",
            "hospital admission",
            Event.ANY,
            Event.ANY,
            form(
                "odds-ratio-times-probability",
                "product",
                Measure.ODDS_RATIO,
                Basis.ANNUAL_PROBABILITY,
                List.of(Step.of("p0", OF_YEAR)),
                Step.of("annual", ODDS, "{base}*{R}"),
                Step.of("p", "1-(1-{:annual})^{cyc}")),
            Map.of("base", 0.41),
            new Ratio(Measure.ODDS_RATIO, 0.64, 0.48, 0.8533, 0.1468),
            null),
        "Annual probability of hospital admission",
        "Odds ratio for hospital admission at 1 year");
    event(
        new Event(
            "surg",
            "surgery",
            Event.ANY,
            Event.ANY,
            form(
                "risk-ratio-over-wrong-horizon",
                "product with the monthly probability",
                Measure.RISK_RATIO,
                Basis.ANNUAL_PROBABILITY,
                List.of(Step.of("p0", OF_YEAR)),
                Step.of("p", "1-(1-{R}*{base})^{cyc}", "{R}*{p0}")),
            Map.of("base", 0.33),
            new Ratio(Measure.RISK_RATIO, 0.58, 0.4202, 0.8006, 0.1644),
            null),
        "Annual probability of surgery",
        "Relative risk (RR) of surgery at 1 year");
    event(
        new Event(
            "frac",
            "fracture",
            Event.ANY,
            Event.ANY,
            form(
                "probability-converted-as-rate",
                "1-EXP(-p t)",
                Measure.HAZARD_RATIO,
                Basis.ANNUAL_PROBABILITY,
                List.of(Step.of("p0", OF_YEAR, "1-EXP(-{base}{xcyc})")),
                Step.of("p", RATIO_POWER)),
            Map.of("base", 0.19),
            new Ratio(Measure.HAZARD_RATIO, 0.81, 0.6651, 0.9865, 0.1006),
            null),
        "Annual probability of fracture",
        "Hazard ratio, fracture");
    event(
        new Event(
            "wd",
            "withdrawal",
            Event.ANY,
            Event.ANY,
            form(
                "ratio-inverted",
                "reciprocal in the power",
                Measure.HAZARD_RATIO,
                Basis.ANNUAL_RATE,
                List.of(Step.of("p0", "1-EXP(-{base}{xcyc})")),
                Step.of("p", RATIO_POWER, "1-(1-{p0})^(1/{R})")),
            Map.of("base", 0.24),
            new Ratio(Measure.HAZARD_RATIO, 0.66, 0.5101, 0.8539, 0.1314),
            null),
        "Annual rate of withdrawal",
        "HR Treatment A vs Usual care (withdrawal)");
  }

  private void death() {
    event(
        new Event(
            "die",
            "death",
            Event.ANY,
            3,
            form(
                "mortality-ratio-times-probability",
                "product, capped",
                Measure.MORTALITY_RATIO,
                Basis.LIFE_TABLE,
                List.of(Step.of("p0", Basis.LIFE_TABLE.usual())),
                Step.of("p", "MIN(1,1-(1-{p0})^{R})", "MIN(1,{p0}*{R})")),
            Map.of(),
            new Ratio(Measure.MORTALITY_RATIO, 2.4, 2.0512, 2.8081, 0.0801),
            null),
        "",
        "Standardised mortality ratio (SMR) against the general population");
  }

  private void values() {
    money("cost.0", "Annual cost, Remission", 900);
    money("cost.1", "Annual cost, Active disease", 4300);
    money("cost.2", "Annual cost, Severe disease", 9800);
    money("drug.0", "Annual drug cost, Usual care", 350);
    money("drug.1", "Annual drug cost, Treatment A", 2900);
    money("cost.inf", "Cost per serious infection", 5200);
    money("cost.hosp", "Cost per hospital admission", 3900);
    money("cost.surg", "Cost per surgery", 6100);
    money("cost.frac", "Cost per fracture", 4700);
    money("cost.wd", "Cost per withdrawal (visit)", 160);
    number("util.0", "Utility, Remission", Section.UTILITIES, 0.83, "", null);
    number("util.1", "Utility, Active disease", Section.UTILITIES, 0.67, "", null);
    number("util.2", "Utility, Severe disease", Section.UTILITIES, 0.48, "", null);
  }

  private static EventForm form(
      String rule, String note, Measure measure, Basis basis, List<Step> before, Step... applied) {
    return new EventForm(rule, note, measure, basis, before, List.of(applied), List.of());
  }

  private void event(Event event, String baseLabel, String ratioLabel) {
    events.add(event);
    new LinkedHashMap<>(event.bases())
        .forEach(
            (name, value) ->
                number(event.symbol(name), baseLabel, Section.CLINICAL, value, "", null));
    inputs.add(Input.effect(event.symbol("R"), ratioLabel, event.ratio()));
  }

  private void money(String symbol, String label, double value) {
    inputs.add(Input.number(symbol, label, Section.COSTS, value).shownAs("#,##0"));
  }

  private void number(
      String symbol, String label, Section section, double value, String unit, String typed) {
    Input input = Input.number(symbol, label, section, value).in(unit);
    inputs.add(typed == null ? input : input.typedAs(typed));
  }
}
