package weighhouse.generator.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import weighhouse.generator.model.Basis;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.Model;
import weighhouse.generator.model.Step;
import weighhouse.generator.model.Words;

/** The lines of an arm's trace, before anyone decides where they stand. */
final class TraceLines {
  private final ModelDraft draft;
  private final Model model;
  private final Words words;
  private final int arm;
  private final List<Line> lines = new ArrayList<>();

  private TraceLines(ModelDraft draft, int arm) {
    this.draft = draft;
    this.model = draft.model();
    this.words = draft.words();
    this.arm = arm;
  }

  /** Lines of time, of probabilities that change, of states by explicit products, of results. */
  static List<Line> of(ModelDraft draft, int arm) {
    TraceLines trace = new TraceLines(draft, arm);
    trace.time();
    trace.steps();
    if (draft.model().isPartitioned()) {
      trace.partition();
    } else {
      trace.states();
    }
    trace.results();
    return trace.lines;
  }

  private void add(String key, String label, String first, String next) {
    lines.add(Line.of(key, label, first, next));
  }

  private void time() {
    add("cycle", words.of("row.cycle"), "0", "{<cycle}+1");
    String time = draft.cycle("{@cycle}{xcyc}");
    add("time", words.of("row.time"), time, time);
    if (model.events().stream().anyMatch(event -> event.form().basis() == Basis.LIFE_TABLE)) {
      add("age", words.of("row.age"), "{age}+{@time}", "{age}+{@time}");
      add("qx", words.of("row.qx"), null, "VLOOKUP(INT({<age}),{lifetable},2)");
    }
  }

  private void steps() {
    for (Event event : model.alongCycles()) {
      event.form().before().forEach(step -> step(event, step));
      if (event.isAffected(arm)) {
        event.form().applied().forEach(step -> step(event, step));
      }
    }
  }

  private void step(Event event, Step step) {
    if (step.isScalar()) {
      return;
    }
    String next = draft.bindLine(event, event.template(step, arm, draft.faulty()), arm);
    String label = words.of("step." + step.name(), event.label());
    String root = event.isRoot(step) ? event.key() : null;
    lines.add(new Line(event.symbol(step.name()), label, first(event, next), next, root));
  }

  /** Curves begin at 1; whatever looks back begins with a number. */
  private static String first(Event event, String next) {
    if (!event.form().basis().isCurve()) {
      return null;
    }
    return next.contains("{<") ? "1" : next;
  }

  /** What a probability is called in the formulas of this arm. */
  private String probability(Event event) {
    if (!event.form().basis().alongCycles()) {
      return "{" + event.result(arm) + "}";
    }
    return "{@" + event.symbol(event.isAffected(arm) ? "p" : "p0") + "}";
  }

  private void states() {
    int living = model.scenario().living().size();
    String death = probability(model.event("die"));
    for (int state = 0; state < living; state++) {
      String stay =
          state + 1 < living ? "*(1-" + probability(model.event("prog" + (state + 1))) + ")" : "";
      String next = "{<s" + state + "}*(1-" + death + ")" + stay;
      if (state > 0) {
        String entry = probability(model.event("prog" + state));
        next += "+{<s" + (state - 1) + "}*(1-" + death + ")*" + entry;
      }
      add("s" + state, model.scenario().living().get(state), state == 0 ? "1" : "0", next);
    }
    String dead = "{<s" + living + "}+(" + sum("<", "", 0) + ")*" + death;
    add("s" + living, words.of("row.dead"), "0", dead);
    String all = sum("@", "", 1);
    add("sum", words.of("row.sum"), all, all);
  }

  /** States as areas between the curves. */
  private void partition() {
    List<String> living = model.scenario().living();
    String os =
        "{@" + model.event("os").symbol(model.event("os").isAffected(arm) ? "S" : "S0") + "}";
    String pfs =
        "{@" + model.event("pfs").symbol(model.event("pfs").isAffected(arm) ? "S" : "S0") + "}";
    twice("s0", living.get(0), pfs);
    twice("s1", living.get(1), os + "-" + pfs);
    twice("s2", words.of("row.dead"), "1-" + os);
    String all = sum("@", "", 1);
    add("sum", words.of("row.sum"), all, all);
  }

  private void twice(String key, String label, String formula) {
    add(key, label, formula, formula);
  }

  /** Sum over living states, each times a symbol; the last {@code more} states beyond them too. */
  private String sum(String when, String times, int more) {
    return IntStream.range(0, model.scenario().living().size() + more)
        .mapToObj(
            state ->
                "{"
                    + when
                    + "s"
                    + state
                    + "}"
                    + (times.isEmpty() ? "" : "*{" + times + state + "}"))
        .collect(Collectors.joining("+"));
  }

  private void results() {
    String years = draft.cycle("{xcyc}");
    twice("ly", "(" + sum("@", "", 0) + ")" + years);
    twice("qaly", "(" + sum("@", "util.", 0) + ")" + years);
    String cost =
        "(" + sum("@", "cost.", 0) + "+(" + sum("@", "", 0) + ")*{drug." + arm + "})" + years;
    add("cost", words.of("row.cost"), cost, cost + eventCosts());
    twice("factor", "1/(1+{disc})^{@time}");
    twice("dly", "{@ly}*{@factor}");
    twice("dqaly", "{@qaly}*{@factor}");
    twice("dcost", "{@cost}*{@factor}");
  }

  /** Costs of events that change no state. */
  private String eventCosts() {
    return model.events().stream()
        .filter(event -> event.to() == Event.ANY)
        .map(
            event ->
                "+(%s)*%s*{cost.%s}".formatted(sum("<", "", 0), probability(event), event.key()))
        .collect(Collectors.joining());
  }

  private void twice(String key, String formula) {
    add(key, words.of("row." + key), formula, formula);
  }
}
