package weighhouse.generator.fault;

import java.util.ArrayList;
import java.util.List;
import weighhouse.generator.model.Basis;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.EventForm.Trait;
import weighhouse.generator.model.Measure;
import weighhouse.generator.model.Step;

/** Collects forms: a heading (rule, measures, bases, traits), then lines of formulas under it. */
public final class FormTable {
  private final List<EventForm> forms = new ArrayList<>();
  private String rule;
  private List<Measure> measures = List.of();
  private List<Basis> bases = List.of();
  private List<Trait> traits = List.of();
  private String effect;

  /** Heading: the rule that the next lines break; null for right forms. */
  public FormTable rule(String id, Trait... demanded) {
    rule = id;
    traits = List.of(demanded);
    effect = null;
    return this;
  }

  /** Heading: measures that the next lines take. */
  public FormTable measures(Measure... taken) {
    measures = List.of(taken);
    return this;
  }

  /** Heading: no effect measure. */
  public FormTable noMeasure() {
    measures = java.util.Collections.singletonList(null);
    return this;
  }

  /** Heading: bases that the next lines take. */
  public FormTable bases(Basis... taken) {
    bases = List.of(taken);
    return this;
  }

  /** Heading: how the effect is applied to {@code p0} where a line is about the step before. */
  public FormTable effect(String right) {
    effect = right;
    return this;
  }

  /** The product in place of the power: a line about {@code p}. */
  public FormTable line(String note, String right, String wrong) {
    return line(note, Step.of("p", right, wrong));
  }

  /** A line about how the effect is applied. */
  public FormTable line(String note, Step... applied) {
    for (Basis basis : bases) {
      String first = basis.isCurve() ? "S0" : "p0";
      add(note, basis, List.of(Step.of(first, basis.usual())), List.of(applied));
    }
    return this;
  }

  /** A line about how the base becomes {@code p0}. */
  public FormTable before(String note, Step... before) {
    for (Basis basis : bases) {
      List<Step> after = effect == null ? List.of() : List.of(Step.of("p", effect));
      add(note, basis, List.of(before), after);
    }
    return this;
  }

  /** A line about both. */
  public FormTable whole(String note, List<Step> before, List<Step> applied) {
    bases.forEach(basis -> add(note, basis, before, applied));
    return this;
  }

  private void add(String note, Basis basis, List<Step> before, List<Step> applied) {
    List<Trait> needed = new ArrayList<>(traits);
    if (java.util.stream.Stream.concat(before.stream(), applied.stream())
        .anyMatch(step -> step.wrong() != null && step.wrong().contains("_xlfn.LET"))) {
      needed.add(Trait.NEEDS_EXCEL);
    }
    for (Measure measure : measures) {
      forms.add(new EventForm(rule, note, measure, basis, before, applied, needed));
    }
  }

  /** All lines. */
  public List<EventForm> forms() {
    return forms;
  }
}
