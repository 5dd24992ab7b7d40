package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.Chains;
import weighhouse.rules.pattern.Factor;
import weighhouse.workbook.CellAddress;

/** What multiplies probabilities, rates and survival in a formula, or is a power of them. */
final class Factors {
  private Factors() {}

  /** A factor or exponent and the product or power it belongs to. */
  record Site(Expr factor, Expr whole) {}

  /** Factors and exponents beside a part of the formula that says how often something happens. */
  static List<Site> ofEvents(Expr tree, CellAddress host, Survey survey) {
    List<Site> sites = new ArrayList<>();
    for (Expr node : Trees.walk(tree)) {
      if (Chains.isProduct(node)) {
        product(node, host, survey, sites);
      } else if (base(node) != null && isEvent(base(node), host, survey)) {
        sites.add(new Site(Trees.inside(Trees.children(node).get(1)), node));
      }
    }
    return sites;
  }

  @SuppressWarnings("ReferenceEquality") // one very node
  private static void product(Expr node, CellAddress host, Survey survey, List<Site> sites) {
    List<Factor> factors =
        Chains.factors(node).stream().filter(factor -> !factor.isSign()).toList();
    for (Factor factor : factors) {
      boolean beside =
          factors.stream().anyMatch(f -> f != factor && isEvent(f.node(), host, survey));
      if (beside && sites.stream().noneMatch(site -> site.factor() == factor.node())) {
        sites.add(new Site(factor.node(), node));
      }
    }
  }

  /** The base of a power, in either of its spellings; null of all else. */
  private static Expr base(Expr node) {
    boolean power =
        (node instanceof Expr.Binary binary && binary.op() == BinaryOp.POWER)
            || (node instanceof Expr.Call call
                && call.function().equals("POWER")
                && call.arguments().size() == 2);
    return power ? Trees.children(node).get(0) : null;
  }

  private static boolean isEvent(Expr node, CellAddress host, Survey survey) {
    return Measures.isEvent(survey.kind(node, host));
  }
}
