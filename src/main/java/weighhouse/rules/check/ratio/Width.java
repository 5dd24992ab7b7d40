package weighhouse.rules.check.ratio;

import java.util.Optional;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;

/**
 * The width of an interval, or of half of it, divided by a number: a standard error read from it.
 *
 * @param node the division
 * @param high what is subtracted from: a ratio or limit
 * @param low what is subtracted: a limit or the ratio
 * @param logs whether logarithms are subtracted
 * @param divisor the number, its present value
 * @param whole whether both are limits
 */
public record Width(Expr node, Expr high, Expr low, boolean logs, double divisor, boolean whole) {
  private static final Set<String> LN = Set.of("LN");
  private static final double LEAST = 1;
  private static final double MOST = 7;

  /** Reads a node of a formula in the host. */
  public static Optional<Width> of(
      Expr node, CellAddress host, ModelView model, Estimates estimates) {
    if (!(node instanceof Expr.Binary)) {
      return Optional.empty();
    }
    double divisor = 1;
    Expr rest = node;
    while (Parts.is(rest, BinaryOp.DIVIDE) && Parts.isConstant(Parts.right(rest))) {
      divisor *= model.value(Parts.right(rest), host);
      rest = Parts.left(rest);
    }
    return divisor >= LEAST && divisor <= MOST && divisor != 1
        ? difference(node, rest, divisor, host, model, estimates)
        : Optional.empty();
  }

  private static Optional<Width> difference(
      Expr node,
      Expr rest,
      double divisor,
      CellAddress host,
      ModelView model,
      Estimates estimates) {
    boolean quotient = Parts.calls(rest, LN, 1);
    Expr inner = quotient ? Parts.argument(rest, 0) : rest;
    if (!Parts.is(inner, quotient ? BinaryOp.DIVIDE : BinaryOp.SUBTRACT)) {
      return Optional.empty();
    }
    Expr high = Parts.left(inner);
    Expr low = Parts.right(inner);
    boolean logs = quotient;
    if (Parts.calls(high, LN, 1) && Parts.calls(low, LN, 1)) {
      high = Parts.argument(high, 0);
      low = Parts.argument(low, 0);
      logs = true;
    }
    CellAddress highCell = model.cell(high, host);
    CellAddress lowCell = model.cell(low, host);
    if (!isFigure(highCell, model, estimates) || !isFigure(lowCell, model, estimates)) {
      return Optional.empty();
    }
    boolean highLimit = estimates.limit(highCell).isPresent();
    boolean lowLimit = estimates.limit(lowCell).isPresent();
    return highLimit || lowLimit
        ? Optional.of(new Width(node, high, low, logs, divisor, highLimit && lowLimit))
        : Optional.empty();
  }

  /** A ratio or a limit of one. */
  private static boolean isFigure(CellAddress cell, ModelView model, Estimates estimates) {
    return cell != null
        && (estimates.limit(cell).isPresent() || Ratios.isRatio(model.quantity(cell)));
  }

  /** The same width taken between logarithms. */
  public Expr onLogScale() {
    Expr difference = Refs.minus(Refs.ln(high), Refs.ln(low));
    return withDifference(node, difference);
  }

  private static Expr withDifference(Expr node, Expr difference) {
    Expr inside = Trees.inside(node);
    return Parts.is(inside, BinaryOp.DIVIDE)
        ? Refs.over(withDifference(Parts.left(inside), difference), Parts.right(inside))
        : difference;
  }

  /** The same width divided by another number. */
  public Expr dividedBy(String divisor) {
    Expr rest = node;
    while (Parts.is(rest, BinaryOp.DIVIDE) && Parts.isConstant(Parts.right(rest))) {
      rest = ((Expr.Binary) Trees.inside(rest)).left();
    }
    return Refs.over(rest, Refs.number(divisor));
  }
}
