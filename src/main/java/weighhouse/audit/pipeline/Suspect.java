package weighhouse.audit.pipeline;

import java.util.ArrayList;
import java.util.List;
import weighhouse.audit.correction.Correction;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * One mistake with all the places where it was made the same way; becomes a finding once weighed.
 *
 * @param rule the rule it breaks
 * @param matches the places, the first one speaks for all
 * @param proven whether the running model confirmed what was read
 */
record Suspect(Rule rule, List<Match> matches, boolean proven) {
  Suspect {
    matches = List.copyOf(matches);
  }

  Match first() {
    return matches.get(0);
  }

  List<CellRange> cells() {
    return matches.stream().flatMap(match -> match.cells().stream()).distinct().toList();
  }

  boolean holds(CellAddress cell) {
    return cells().stream().anyMatch(range -> range.contains(cell));
  }

  Suspect confirmed() {
    return new Suspect(rule, matches, true);
  }

  /** What would mend it; empty where the rule can give no formula. */
  List<Correction> corrections(Subject subject) {
    List<Correction> corrections = new ArrayList<>();
    for (Match match : matches) {
      if (match.suggestion() != null) {
        var shape = subject.shapes().at(match.host());
        corrections.add(
            new Correction(
                match.cells(),
                match.host(),
                shape == null ? match.suggestion() : shape.tree(),
                match.offending(),
                match.suggestion()));
      }
    }
    return corrections;
  }
}
