package weighhouse.rules.check.synthesis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;

/** The ways in which formulas write the mean of several ratios. */
final class MeanForms {
  private final RatioOperands operands;

  MeanForms(ModelView model) {
    this.operands = new RatioOperands(model);
  }

  /**
   * A mean.
   *
   * @param ratios what is averaged
   * @param onLogScale the same mean of logarithms, and back
   * @param ofPatients whether the weights are shares of patients
   */
  record Mean(Expr ratios, Expr onLogScale, boolean ofPatients) {}

  static boolean mayBeMean(Expr tree) {
    return Trees.contains(
        tree,
        node ->
            (node instanceof Expr.Call call
                    && Set.of("AVERAGE", "SUMPRODUCT", "SUM").contains(call.function()))
                || (node instanceof Expr.Binary sum && sum.op() == BinaryOp.ADD));
  }

  Optional<Mean> of(Expr node, CellAddress host) {
    if (node instanceof Expr.Call call && call.function().equals("AVERAGE")) {
      return average(call, host);
    } else if (Parts.is(node, BinaryOp.DIVIDE)) {
      return quotient(node, host);
    }
    return Parts.is(node, BinaryOp.ADD) ? weightedSum(node, host) : sumProductOfShares(node, host);
  }

  /** {@code AVERAGE(R1, R2, ...)}: the geometric mean is the mean of the logarithms. */
  private Optional<Mean> average(Expr.Call call, CellAddress host) {
    boolean several =
        call.arguments().size() > 1 || call.arguments().get(0) instanceof Expr.AreaRef;
    return several && call.arguments().stream().allMatch(a -> operands.areRatios(a, host))
        ? mean(call.arguments().get(0), new Expr.Call("GEOMEAN", call.arguments()))
        : Optional.empty();
  }

  private static Optional<Mean> mean(Expr ratios, Expr corrected) {
    return Optional.of(new Mean(ratios, corrected, false));
  }

  /** {@code SUMPRODUCT(w, R)/SUM(w)}, {@code (R1+R2)/2}, {@code SUM(R)/n}. */
  private Optional<Mean> quotient(Expr node, CellAddress host) {
    Expr above = Parts.left(node);
    Expr below = Parts.right(node);
    if (Parts.calls(above, Set.of("SUMPRODUCT"), 2)) {
      return Parts.calls(below, Set.of("SUM"), 1)
          ? sumProduct(above, host).map(m -> over(m, node))
          : Optional.empty();
    }
    List<Parts.Addend> addends = Parts.addends(above);
    boolean count =
        below instanceof Expr.Num number && number.value() == addends.size() && addends.size() > 1;
    return count
            && addends.stream().allMatch(a -> !a.negative() && operands.areRatios(a.node(), host))
        ? mean(addends.get(0).node(), exp(Refs.over(sum(logs(addends)), below)))
        : Optional.empty();
  }

  /**
   * A sum of products taken as part of a quotient: the whole quotient goes into the exponential.
   */
  private static Mean over(Mean inner, Expr node) {
    Expr.Call exp = (Expr.Call) inner.onLogScale();
    Expr corrected = exp(Refs.over(exp.arguments().get(0), Parts.right(node)));
    return new Mean(inner.ratios(), corrected, inner.ofPatients());
  }

  /** {@code SUMPRODUCT(w, R)} where the weights are shares. */
  private Optional<Mean> sumProductOfShares(Expr node, CellAddress host) {
    return Parts.calls(node, Set.of("SUMPRODUCT"), 2)
        ? sumProduct(node, host).filter(Mean::ofPatients)
        : Optional.empty();
  }

  private Optional<Mean> sumProduct(Expr node, CellAddress host) {
    Expr first = Parts.argument(node, 0);
    Expr second = Parts.argument(node, 1);
    boolean secondIs = operands.areRatios(second, host);
    Expr ratios = secondIs ? second : first;
    Expr weights = secondIs ? first : second;
    if (!operands.areRatios(ratios, host)
        || operands.areRatios(weights, host)
        || operands.isEvent(weights, host)) {
      return Optional.empty();
    }
    Expr logs = Refs.ln(ratios);
    Expr product =
        secondIs ? Refs.call("SUMPRODUCT", weights, logs) : Refs.call("SUMPRODUCT", logs, weights);
    return Optional.of(new Mean(ratios, exp(product), operands.isShare(weights, host)));
  }

  /** {@code w*R1 + (1-w)*R2}, or with weights of their own. */
  private Optional<Mean> weightedSum(Expr node, CellAddress host) {
    List<Expr> logs = new ArrayList<>();
    List<Expr> weights = new ArrayList<>();
    Expr ratio = null;
    for (Parts.Addend addend : Parts.addends(node)) {
      List<Expr> factors = Parts.factors(addend.node());
      int place = factors.size() == 2 && !addend.negative() ? ratioOf(factors, host) : -1;
      if (place < 0) {
        return Optional.empty();
      }
      ratio = factors.get(place);
      Expr weight = factors.get(1 - place);
      weights.add(weight);
      logs.add(
          place == 0 ? Refs.times(Refs.ln(ratio), weight) : Refs.times(weight, Refs.ln(ratio)));
    }
    boolean whole = logs.size() > 1 && operands.sumsToOne(weights, host);
    boolean shares = weights.stream().anyMatch(w -> operands.isShare(w, host));
    return whole ? Optional.of(new Mean(ratio, exp(sum(logs)), shares)) : Optional.empty();
  }

  private int ratioOf(List<Expr> factors, CellAddress host) {
    boolean first = operands.isRatioCell(factors.get(0), host);
    boolean second = operands.isRatioCell(factors.get(1), host);
    if (first == second || operands.isEvent(factors.get(first ? 1 : 0), host)) {
      return -1;
    }
    return first ? 0 : 1;
  }

  private static List<Expr> logs(List<Parts.Addend> addends) {
    return addends.stream().map(addend -> Refs.ln(addend.node())).toList();
  }

  private static Expr sum(List<Expr> parts) {
    return parts.stream().reduce(Refs::plus).orElseThrow();
  }

  private static Expr exp(Expr of) {
    return Refs.call("EXP", of);
  }
}
