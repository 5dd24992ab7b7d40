package weighhouse.rules;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.workbook.CellRange;

/**
 * Leaves out what another match says better where checks are among them, of which the patterns know
 * nothing: what a check found on cells that follow from the place of a rule that it yields to (a
 * curve that rises because of a formula before it is not the root), and what a pattern found in
 * cells of which a check has more to say.
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
      boolean said =
          matches.stream()
              .filter(other -> rule.yieldsTo(rules.get(other.rule().id())))
              .anyMatch(other -> isCheck(rule) ? follows(match, other) : isOfCheck(match, other));
      if (!said) {
        roots.add(match);
      }
    }
    return roots;
  }

  private static boolean isCheck(LoadedRule rule) {
    return rule.file().check() != null;
  }

  private boolean isOfCheck(Match match, Match other) {
    return isCheck(rules.get(other.rule().id())) && overlap(match.cells(), other.cells());
  }

  private boolean follows(Match match, Match root) {
    List<CellRange> reached = new ArrayList<>(root.cells());
    reached.addAll(subject.recalculation().dependents(Set.of(root.host())));
    return overlap(match.cells(), reached);
  }

  private static boolean overlap(List<CellRange> a, List<CellRange> b) {
    return a.stream().anyMatch(range -> b.stream().anyMatch(range::overlaps));
  }
}
