package weighhouse.audit.pipeline;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Shape;
import weighhouse.rules.Match;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellRange;

/**
 * Joins matches that a reviewer would call one mistake: one rule on one sheet, and either the same
 * formula or the neighbouring cell (a column whose every row was written out separately).
 */
final class Grouping {
  private final Subject subject;

  Grouping(Subject subject) {
    this.subject = subject;
  }

  List<Suspect> group(List<Match> matches) {
    Map<String, List<Match>> byRuleAndSheet = new LinkedHashMap<>();
    for (Match match : matches) {
      String key = match.rule().id() + "@" + match.host().sheet();
      byRuleAndSheet.computeIfAbsent(key, k -> new ArrayList<>()).add(match);
    }
    List<Suspect> suspects = new ArrayList<>();
    for (List<Match> together : byRuleAndSheet.values()) {
      for (List<Match> one : joined(together)) {
        suspects.add(new Suspect(one.get(0).rule(), one, false));
      }
    }
    return suspects;
  }

  private List<List<Match>> joined(List<Match> matches) {
    List<List<Match>> groups = new ArrayList<>();
    for (Match match : matches) {
      List<List<Match>> touching =
          groups.stream().filter(g -> g.stream().anyMatch(m -> belong(m, match))).toList();
      List<Match> merged = new ArrayList<>();
      touching.forEach(merged::addAll);
      merged.add(match);
      groups.removeIf(group -> touching.stream().anyMatch(t -> t.equals(group)));
      groups.add(merged);
    }
    return groups;
  }

  private boolean belong(Match a, Match b) {
    return sameFormula(a, b)
        || a.cells().stream().anyMatch(r -> b.cells().stream().anyMatch(s -> neighbours(r, s)));
  }

  private boolean sameFormula(Match a, Match b) {
    Shape one = subject.shapes().at(a.host());
    Shape other = subject.shapes().at(b.host());
    return one != null && other != null && one.id() == other.id();
  }

  /** Whether two ranges overlap or stand next to each other in one row or one column. */
  private static boolean neighbours(CellRange a, CellRange b) {
    int rowGap = Math.max(a.firstRow(), b.firstRow()) - Math.min(a.lastRow(), b.lastRow());
    int columnGap =
        Math.max(a.firstColumn(), b.firstColumn()) - Math.min(a.lastColumn(), b.lastColumn());
    return (rowGap <= 1 && columnGap <= 0) || (rowGap <= 0 && columnGap <= 1);
  }
}
