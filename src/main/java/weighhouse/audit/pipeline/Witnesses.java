package weighhouse.audit.pipeline;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.audit.ActsOn;
import weighhouse.audit.probe.Observation;
import weighhouse.formula.Expr;
import weighhouse.formula.Shape;
import weighhouse.quantity.Kind;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.RuleBook;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;

/**
 * Brings reading and probing together: the probe confirms what a pattern saw where a measure
 * enters, and adds what no pattern saw.
 */
final class Witnesses {
  private final Subject subject;
  private final RuleBook rules;

  Witnesses(Subject subject, RuleBook rules) {
    this.subject = subject;
    this.rules = rules;
  }

  List<Suspect> join(List<Suspect> read, List<Observation> observations) {
    List<Suspect> joined = new ArrayList<>(read);
    List<Match> unseen = new ArrayList<>();
    for (Observation observation : observations) {
      for (Observation.Entering entering : observation.entries()) {
        broken(observation, entering)
            .ifPresent(rule -> settle(joined, unseen, observation, entering, rule));
      }
    }
    for (Suspect added : new Grouping(subject).group(unseen)) {
      joined.add(added.confirmed());
    }
    return joined;
  }

  private Optional<Rule> broken(Observation observation, Observation.Entering entering) {
    Kind entered = subject.quantities().at(entering.region().range().first()).kind();
    return ProbeRules.broken(observation.entry().kind(), entered, entering).flatMap(rules::rule);
  }

  private void settle(
      List<Suspect> joined,
      List<Match> unseen,
      Observation observation,
      Observation.Entering entering,
      Rule rule) {
    CellAddress first = entering.region().range().first();
    boolean known = false;
    for (int i = 0; i < joined.size(); i++) {
      Suspect suspect = joined.get(i);
      if (suspect.holds(first)) {
        known = true;
        if (suspect.rule().id().equals(rule.id())) {
          joined.set(i, suspect.confirmed());
        }
      }
    }
    if (!known && !reachesThroughSuspect(joined, observation, first)) {
      unseen.add(match(observation, entering, rule));
    }
  }

  /** Whether a suspect on the way from the measure to the cell already explains the answer. */
  private boolean reachesThroughSuspect(
      List<Suspect> suspects, Observation observation, CellAddress cell) {
    return suspects.stream()
        .filter(s -> s.rule().family().equals("scale"))
        .flatMap(s -> s.cells().stream())
        .filter(range -> depends(range.first(), observation.entry().cell()))
        .anyMatch(range -> depends(cell, range.first()));
  }

  private boolean depends(CellAddress cell, CellAddress on) {
    return subject.recalculation().dependents(java.util.Set.of(on)).stream()
        .anyMatch(range -> range.contains(cell));
  }

  private Match match(Observation observation, Observation.Entering entering, Rule rule) {
    CellAddress host = entering.region().range().first();
    Shape shape = subject.shapes().at(host);
    CellAddress measure = observation.entry().cell();
    Optional<Expr> reference = MeasureReference.in(subject, shape.tree(), host, measure);
    Expr suggestion =
        entering.actsOn() == ActsOn.RISK && entering.exponent() > 0 && entering.exponent() < 1.5
            ? reference.flatMap(r -> OnHazard.rewrite(rule.id(), shape.tree(), r)).orElse(null)
            : null;
    return new Match(
        rule,
        List.of(entering.region().range()),
        host,
        null,
        suggestion,
        reference.<Map<String, Expr>>map(r -> Map.of("hr", r)).orElse(Map.of()),
        List.of("Seen in the running model: the formula itself does not show it."));
  }
}
