package weighhouse.generator.demo;

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

/** A partitioned-survival model with two faults on its curves. */
final class PartitionedDemo {
  private PartitionedDemo() {}

  static Model model() {
    List<Event> events =
        List.of(
            curve(
                "os",
                "overall survival",
                new Curve(6.4, 1.21),
                new Ratio(Measure.HAZARD_RATIO, 0.74, 0.6104, 0.8971, 0.0982),
                "hazard-ratio-on-accelerated-scale",
                Step.of("scaleAdj", "{scale}*{R}^(-1/{shape})", "{scale}/{R}"),
                Step.of("S", "EXP(-(({t}/{:scaleAdj})^{shape}))")),
            curve(
                "pfs",
                "progression-free survival",
                new Curve(2.1, 1.21),
                new Ratio(Measure.HAZARD_RATIO, 0.61, 0.4942, 0.7529, 0.1074),
                "hazard-ratio-times-survival",
                Step.of("S", "{S0}^{R}", "{S0}*{R}")));
    Scenario scenario =
        new Scenario(
            new Words("en", "Usual care", "Treatment A"),
            List.of("progression"),
            List.of("Progression-free", "Progressed disease"));
    return new Model(scenario, CycleUnit.MONTH, CycleInput.YEARS, 64, events, inputs(events));
  }

  private record Curve(double scale, double shape) {}

  private static Event curve(
      String key, String label, Curve curve, Ratio ratio, String rule, Step... applied) {
    EventForm form =
        new EventForm(
            rule,
            "Weibull",
            Measure.HAZARD_RATIO,
            Basis.WEIBULL_SCALE,
            List.of(Step.of("S0", Basis.WEIBULL_SCALE.usual())),
            List.of(applied),
            List.of());
    Map<String, Double> bases = Map.of("scale", curve.scale(), "shape", curve.shape());
    return new Event(key, label, Event.ANY, Event.ANY - 1, form, bases, ratio, null);
  }

  private static List<Input> inputs(List<Event> events) {
    Event os = events.get(0);
    Event pfs = events.get(1);
    return List.of(
        Input.number("cycle", "Cycle length (years)", Section.GENERAL, 1 / 12.0).typedAs("1/12"),
        Input.number("disc", "Discount rate (per year)", Section.GENERAL, 0.035),
        Input.number("wtp", "Willingness to pay per QALY", Section.GENERAL, 30000),
        parameter(os, "scale", "Weibull scale b (years), overall survival"),
        parameter(os, "shape", "Weibull shape a, overall survival"),
        parameter(pfs, "scale", "Weibull scale b (years), progression-free survival"),
        parameter(pfs, "shape", "Weibull shape a, progression-free survival"),
        Input.effect("os.R", "Hazard ratio, overall survival", os.ratio()),
        Input.effect("pfs.R", "HR (95% CI), progression-free survival", pfs.ratio()),
        Input.number("cost.0", "Annual cost, Progression-free", Section.COSTS, 2400),
        Input.number("cost.1", "Annual cost, Progressed disease", Section.COSTS, 8100),
        Input.number("drug.0", "Annual drug cost, Usual care", Section.COSTS, 600),
        Input.number("drug.1", "Annual drug cost, Treatment A", Section.COSTS, 5400),
        Input.number("util.0", "Utility, Progression-free", Section.UTILITIES, 0.79),
        Input.number("util.1", "Utility, Progressed disease", Section.UTILITIES, 0.61));
  }

  private static Input parameter(Event event, String name, String label) {
    return Input.number(event.symbol(name), label, Section.CLINICAL, event.bases().get(name));
  }
}
