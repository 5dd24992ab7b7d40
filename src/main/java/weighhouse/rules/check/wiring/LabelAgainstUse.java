package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.quantity.Basis;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.Chains;
import weighhouse.rules.pattern.Factor;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * A cell that is called an effect measure and used as if it were a rate, a probability or a
 * logarithm; and a declared cell against which the formulas speak. Probabilities that are called
 * rates are left to the rules on conversions.
 */
public final class LabelAgainstUse implements Check {
  private static final Set<Kind> TIMES =
      EnumSet.of(Kind.TIME, Kind.CYCLE_LENGTH, Kind.CYCLES_PER_YEAR, Kind.COUNT);

  @Override
  public String name() {
    return "label-against-use";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Map<CellAddress, String> contradicted = new LinkedHashMap<>();
    for (Region region : survey.regions()) {
      CellAddress host = region.range().first();
      for (Expr node : Trees.walk(survey.tree(region))) {
        misused(node, host, survey, contradicted);
      }
    }
    List<Match> matches = new ArrayList<>();
    contradicted.forEach(
        (cell, note) -> matches.add(Survey.match(rule, CellRange.of(cell), null, null, note)));
    declared(subject, rule, matches);
    return matches;
  }

  private static void declared(Subject subject, Rule rule, List<Match> matches) {
    for (CellRange range : subject.quantities().ranges()) {
      Inferred inferred = subject.quantities().inferred(range.first());
      if (inferred.basis() == Basis.DECLARED && !inferred.contradictions().isEmpty()) {
        String[] notes = inferred.contradictions().toArray(String[]::new);
        matches.add(Survey.match(rule, range, null, null, notes));
      }
    }
  }

  private static void misused(
      Expr node, CellAddress host, Survey survey, Map<CellAddress, String> found) {
    boolean exponential = node instanceof Expr.Call call && call.function().equals("EXP");
    Expr product = exponential ? Trees.inside(Trees.children(node).get(0)) : node;
    if (!exponential && !Chains.isProduct(node)) {
      return;
    }
    List<Factor> factors = Chains.factors(product);
    boolean negative = factors.stream().anyMatch(Factor::isSign);
    Kind beside = exponential ? null : Kind.OCCUPANCY;
    CellAddress ratio = onlyRatio(factors, beside, host, survey);
    if (ratio != null) {
      String use = exponential ? negative ? "a rate" : "a logarithm" : "a probability";
      found.putIfAbsent(
          ratio, "Used as " + use + " in " + survey.subject().workbook().show(host) + ".");
    }
  }

  /**
   * The one cell of a ratio in a product of nothing but numbers, times and, where it is given, a
   * factor of the other kind; null if there is none.
   */
  private static CellAddress onlyRatio(
      List<Factor> factors, Kind beside, CellAddress host, Survey survey) {
    CellAddress ratio = null;
    boolean met = beside == null;
    for (Factor factor : factors) {
      Kind kind = factor.isSign() ? Kind.UNKNOWN : survey.kind(factor.node(), host);
      boolean plain = factor.isSign() || factor.node() instanceof Expr.Num || TIMES.contains(kind);
      if (Measures.isRatio(kind) && ratio == null && !factor.inverse()) {
        ratio = survey.cell(factor.node(), host).orElse(null);
      } else if (kind == beside) {
        met = true;
      } else if (!plain) {
        return null;
      }
    }
    return met ? ratio : null;
  }
}
