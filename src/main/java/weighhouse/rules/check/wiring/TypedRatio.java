package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.Trees;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;

/** A number in a formula where an effect measure of the workbook belongs. */
public final class TypedRatio implements Check {
  /** Numbers that formulas hold for many other reasons. */
  private static final Set<Double> COMMON = Set.of(0.1, 0.25, 0.5, 0.75, 0.9, 1.5, 2.5, 365.25);

  @Override
  public String name() {
    return "typed-ratio";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Search search = new Search(new Survey(subject), rule);
    search.run();
    return search.found;
  }

  private static final class Search {
    private final Survey survey;
    private final Rule rule;
    private final Siblings siblings;
    private final List<CellAddress> measures;
    private final List<Match> found = new ArrayList<>();

    Search(Survey survey, Rule rule) {
      this.survey = survey;
      this.rule = rule;
      this.siblings = new Siblings(survey);
      this.measures = survey.measures().stream().filter(survey::isTyped).toList();
    }

    void run() {
      for (Region region : survey.regions()) {
        Expr tree = survey.tree(region);
        List<Expr> read = survey.measuresIn(tree, region.range().first());
        if (!read.isEmpty()) {
          siblings.of(region).forEach(pair -> besideMeasure(pair, read));
        }
        for (Factors.Site site : Factors.ofEvents(tree, region.range().first(), survey)) {
          if (site.factor() instanceof Expr.Num number) {
            equalsMeasure(region, number);
          }
        }
      }
    }

    /** A sibling's formula is this one but for a number in place of the measure. */
    private void besideMeasure(Siblings.Pair pair, List<Expr> read) {
      Shape odd = survey.subject().shapes().at(pair.odd().first());
      if (odd == null) {
        return;
      }
      Expr full = survey.tree(pair.regular());
      for (Expr node : Trees.walk(odd.tree())) {
        if (node instanceof Expr.Num number && !isNeutral(number, read, pair.regular())) {
          boolean stands =
              read.stream().anyMatch(m -> Trees.replace(odd.tree(), node, m).equals(full));
          if (stands) {
            add(survey.subject().shapes().regionAt(pair.odd().first()), node, full);
          }
        }
      }
    }

    private boolean isNeutral(Expr.Num number, List<Expr> read, Region regular) {
      return read.stream()
          .mapToDouble(m -> Measures.neutral(survey.kind(m, regular.range().first())))
          .anyMatch(neutral -> neutral == number.value());
    }

    private void equalsMeasure(Region region, Expr.Num number) {
      CellAddress host = region.range().first();
      Optional<CellAddress> same =
          isTelling(number.value()) && survey.isRead(host) ? holding(number) : Optional.empty();
      same.ifPresent(
          cell ->
              add(
                  region,
                  number,
                  Trees.replace(survey.tree(region), number, survey.fixed(cell, host))));
    }

    private static boolean isTelling(double value) {
      return value != Math.rint(value) && !COMMON.contains(value);
    }

    /** The measure's cell of that value; one that nothing reads comes first. */
    private Optional<CellAddress> holding(Expr.Num number) {
      List<CellAddress> equal =
          measures.stream()
              .filter(cell -> Measures.isRatio(survey.kind(cell)))
              .filter(cell -> survey.base().number(cell) == number.value())
              .toList();
      return equal.stream()
          .filter(cell -> !survey.isRead(cell))
          .findFirst()
          .or(() -> equal.stream().findFirst());
    }

    private void add(Region region, Expr number, Expr suggestion) {
      boolean known = found.stream().anyMatch(match -> match.cells().contains(region.range()));
      if (!known) {
        found.add(Survey.match(rule, region.range(), number, suggestion));
      }
    }
  }
}
