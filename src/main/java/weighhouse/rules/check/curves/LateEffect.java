package weighhouse.rules.check.curves;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;

/**
 * An effect that begins at some time and is then put on survival since the start: {@code
 * IF(t<T,S,S^HR)}, {@code S^IF(t>=T,HR,1)}. Survival jumps at T, whether or not a step of the table
 * is short enough to show it as a rise.
 */
final class LateEffect {
  private static final Set<Kind> TIMES = EnumSet.of(Kind.TIME, Kind.COUNT, Kind.AGE);

  private final Survey survey;

  LateEffect(Survey survey) {
    this.survey = survey;
  }

  /** Whether the formula is one, with a ratio below 1. */
  boolean isIn(Expr tree, CellAddress host) {
    return Trees.walk(tree).stream()
        .anyMatch(node -> isChoiceOfCurves(node, host) || isLatePower(node, host));
  }

  private boolean isChoiceOfCurves(Expr node, CellAddress host) {
    List<Expr> branches = branches(node, host);
    for (int i = 0; i < branches.size(); i++) {
      Expr with = Trees.inside(branches.get(i));
      Expr without = Trees.inside(branches.get(1 - i));
      if (with instanceof Expr.Binary power
          && isPowerOfSurvival(power, host)
          && Trees.inside(power.left()).equals(without)
          && isBenefit(power.right(), host)) {
        return true;
      }
    }
    return false;
  }

  private boolean isLatePower(Expr node, CellAddress host) {
    if (!(node instanceof Expr.Binary power) || !isPowerOfSurvival(power, host)) {
      return false;
    }
    List<Expr> branches = branches(Trees.inside(power.right()), host);
    return branches.stream().anyMatch(LateEffect::isOne)
        && branches.stream().anyMatch(branch -> isBenefit(branch, host));
  }

  private boolean isPowerOfSurvival(Expr.Binary power, CellAddress host) {
    Expr base = Trees.inside(power.left());
    return power.op() == BinaryOp.POWER
        && Trees.children(base).isEmpty()
        && survey.kind(base, host) == Kind.SURVIVAL;
  }

  /** The two sides of a choice that time decides. */
  private List<Expr> branches(Expr node, CellAddress host) {
    boolean choice =
        node instanceof Expr.Call call
            && call.function().equals("IF")
            && call.arguments().size() == 3
            && Trees.contains(
                call.arguments().get(0), leaf -> TIMES.contains(survey.kind(leaf, host)));
    return choice ? Trees.children(node).subList(1, 3) : List.of();
  }

  private boolean isBenefit(Expr ratio, CellAddress host) {
    return Measures.isRatio(survey.kind(ratio, host)) && survey.value(ratio, host) < 1;
  }

  private static boolean isOne(Expr node) {
    return Trees.inside(node) instanceof Expr.Num number && number.value() == 1;
  }
}
