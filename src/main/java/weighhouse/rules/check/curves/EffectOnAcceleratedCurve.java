package weighhouse.rules.check.curves;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;

/**
 * A hazard ratio in a log-normal, log-logistic or generalised gamma curve, or in a power of one.
 */
public final class EffectOnAcceleratedCurve implements Check {
  private static final Set<Kind> RATIOS =
      EnumSet.of(
          Kind.HAZARD_RATIO,
          Kind.RATE_RATIO,
          Kind.MORTALITY_RATIO,
          Kind.HAZARD_REDUCTION,
          Kind.LOG_HAZARD_RATIO);
  private static final Set<String> NORMAL =
      Set.of("NORMSDIST", "NORM.S.DIST", "NORMDIST", "NORM.DIST", "LOGNORMDIST", "LOGNORM.DIST");
  private static final Set<String> GAMMA = Set.of("GAMMADIST", "GAMMA.DIST");

  @Override
  public String name() {
    return "effect-on-accelerated-curve";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Match> matches = new ArrayList<>();
    for (Region region : survey.regions()) {
      CellAddress host = region.range().first();
      Expr tree = survey.tree(region);
      boolean effect =
          survey.measuresIn(tree, host).stream().anyMatch(m -> isRatio(m, host, survey));
      if (effect) {
        node(tree, host, survey)
            .ifPresent(node -> matches.add(Survey.match(rule, region.range(), node, null)));
      }
    }
    return matches;
  }

  private static boolean isRatio(Expr measure, CellAddress host, Survey survey) {
    return RATIOS.contains(survey.kind(measure, host));
  }

  /** The part in which the ratio meets a curve. */
  private static Optional<Expr> node(Expr tree, CellAddress host, Survey survey) {
    return Trees.walk(tree).stream()
        .filter(node -> !survey.measuresIn(node, host).isEmpty())
        .filter(node -> isCurve(node) || isPowerOfCurve(node, host, survey))
        .findFirst();
  }

  private static boolean isPowerOfCurve(Expr node, CellAddress host, Survey survey) {
    if (!(node instanceof Expr.Binary power) || power.op() != BinaryOp.POWER) {
      return false;
    }
    Expr base = power.left();
    Shape shape = survey.cell(base, host).map(survey.subject().shapes()::at).orElse(null);
    Expr curve = shape == null ? base : shape.tree();
    return survey.kind(base, host) == Kind.SURVIVAL
        && isRatio(Trees.inside(power.right()), host, survey)
        && Trees.contains(curve, EffectOnAcceleratedCurve::isCurve);
  }

  /** Log-normal: a normal distribution of a logarithm; log-logistic: 1/(1+(t/b)^a). */
  private static boolean isCurve(Expr node) {
    if (node instanceof Expr.Call call) {
      boolean normal =
          NORMAL.contains(call.function())
              && (call.function().startsWith("LOGN") || Trees.contains(call, logarithm()));
      return normal || (GAMMA.contains(call.function()) && Trees.contains(call, powerOrExp()));
    }
    return node instanceof Expr.Binary quotient
        && quotient.op() == BinaryOp.DIVIDE
        && isOne(quotient.left())
        && Trees.inside(quotient.right()) instanceof Expr.Binary sum
        && sum.op() == BinaryOp.ADD
        && (isOne(sum.left()) ? isPower(sum.right()) : isOne(sum.right()) && isPower(sum.left()));
  }

  private static Predicate<Expr> logarithm() {
    return node -> node instanceof Expr.Call call && call.function().equals("LN");
  }

  private static Predicate<Expr> powerOrExp() {
    return node ->
        isPower(node) || (node instanceof Expr.Call call && call.function().equals("EXP"));
  }

  private static boolean isOne(Expr node) {
    return Trees.inside(node) instanceof Expr.Num number && number.value() == 1;
  }

  /** A power whose exponent is no plain number, which would make it a discount factor. */
  private static boolean isPower(Expr node) {
    return Trees.inside(node) instanceof Expr.Binary power
        && power.op() == BinaryOp.POWER
        && Trees.inside(power.left()) instanceof Expr.Binary inner
        && (inner.op() == BinaryOp.DIVIDE || inner.op() == BinaryOp.MULTIPLY);
  }
}
