package weighhouse.rules;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.rules.pattern.Found;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Matches patterns region by region: a region whose first, middle and last cell agree is one match;
 * a region whose operands change their meaning on the way is split where they do.
 */
final class RegionMatcher {
  private final Subject subject;
  private final HostMatcher hosts;

  RegionMatcher(List<LoadedRule> rules, Subject subject) {
    this.subject = subject;
    this.hosts = new HostMatcher(rules, subject);
  }

  List<Match> match() {
    List<Match> matches = new ArrayList<>();
    for (Region region : subject.shapes().regions()) {
      Shape shape = subject.shapes().all().get(region.shape());
      matches.addAll(new OneRegion(shape).match(region.range()));
    }
    return matches;
  }

  private final class OneRegion {
    private final Shape shape;
    private final Map<CellAddress, List<HostMatcher.Hit>> known = new HashMap<>();

    OneRegion(Shape shape) {
      this.shape = shape;
    }

    List<Match> match(CellRange range) {
      List<HostMatcher.Hit> first = hits(range.first());
      CellAddress middle = range.first().offset((range.rows() - 1) / 2, (range.columns() - 1) / 2);
      if (shape.array() || (agree(first, hits(range.last())) && agree(first, hits(middle)))) {
        return first.stream().map(hit -> matchOf(hit, range)).toList();
      }
      List<Match> matches = new ArrayList<>(match(half(range, true)));
      matches.addAll(match(half(range, false)));
      return matches;
    }

    private List<HostMatcher.Hit> hits(CellAddress cell) {
      return known.computeIfAbsent(cell, host -> hosts.match(shape.tree(), host));
    }
  }

  private static boolean agree(List<HostMatcher.Hit> a, List<HostMatcher.Hit> b) {
    if (a.size() != b.size()) {
      return false;
    }
    for (int i = 0; i < a.size(); i++) {
      if (!a.get(i).sameAs(b.get(i))) {
        return false;
      }
    }
    return true;
  }

  private static CellRange half(CellRange range, boolean first) {
    if (range.rows() > 1) {
      int middle = range.firstRow() + (range.rows() - 1) / 2;
      return new CellRange(
          range.sheet(),
          first ? range.firstRow() : middle + 1,
          range.firstColumn(),
          first ? middle : range.lastRow(),
          range.lastColumn());
    }
    int middle = range.firstColumn() + (range.columns() - 1) / 2;
    return new CellRange(
        range.sheet(),
        range.firstRow(),
        first ? range.firstColumn() : middle + 1,
        range.lastRow(),
        first ? middle : range.lastColumn());
  }

  private static Match matchOf(HostMatcher.Hit hit, CellRange range) {
    Found found = hit.found();
    String assumes = hit.rule().file().assumes();
    Map<String, Expr> operands = found.operands();
    return new Match(
        hit.rule().withLevelOf(found.pattern()),
        List.of(range),
        range.first(),
        found.offending(),
        found.suggestion(),
        operands,
        assumes == null || found.suggestion() == null
            ? List.of()
            : List.of("The correction assumes: " + assumes + "."));
  }
}
