package weighhouse.rules;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.workbook.CellRange;

/**
 * Leaves out what a check found on cells that follow from a place where a rule was found that it
 * yields to: a curve that rises because of a formula before it is not the root.
 */
final class Consequences {
  private final Map<String, LoadedRule> rules;
  private final Subject subject;

  Consequences(Map<String, LoadedRule> rules, Subject subject) {
    this.rules = rules;
    this.subject = subject;
  }

  List<Match> leaveOut(List<Match> matches) {
    List<Match> roots = new ArrayList<>();
    for (Match match : matches) {
      LoadedRule rule = rules.get(match.rule().id());
      boolean follows =
          rule.file().check() != null
              && matches.stream()
                  .filter(other -> rule.yieldsTo(rules.get(other.rule().id())))
                  .anyMatch(other -> follows(match, other));
      if (!follows) {
        roots.add(match);
      }
    }
    return roots;
  }

  private boolean follows(Match match, Match root) {
    List<CellRange> reached = new ArrayList<>(root.cells());
    reached.addAll(subject.recalculation().dependents(Set.of(root.host())));
    return reached.stream().anyMatch(r -> match.cells().stream().anyMatch(r::overlaps));
  }
}
