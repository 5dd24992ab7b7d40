package weighhouse.rules.check.uncertainty;

import java.util.List;
import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.rules.check.ratio.Ratios;
import weighhouse.workbook.CellAddress;

/**
 * A ratio moved by a share of itself: {@code R*0.8}, {@code R*(1-20%)}, {@code R*(1+range)}.
 *
 * @param ratio the ratio as the formula writes it
 * @param factor by how much it is multiplied
 */
record RangeFactor(Expr ratio, double factor) {
  private static final double LEAST = 0.3;
  private static final double MOST = 1.7;

  static Optional<RangeFactor> of(Expr node, CellAddress host, ModelView model) {
    List<Expr> factors = Parts.factors(node);
    if (factors.size() != 2) {
      return Optional.empty();
    }
    return of(factors.get(0), factors.get(1), host, model)
        .or(() -> of(factors.get(1), factors.get(0), host, model));
  }

  private static Optional<RangeFactor> of(
      Expr ratio, Expr share, CellAddress host, ModelView model) {
    boolean estimate =
        model.cell(ratio, host) != null && Ratios.isEstimate(model.quantity(ratio, host));
    if (!estimate || !isShare(share)) {
      return Optional.empty();
    }
    double factor = model.value(share, host);
    boolean moves = factor >= LEAST && factor <= MOST && Math.abs(factor - 1) > 1e-9;
    return moves ? Optional.of(new RangeFactor(ratio, factor)) : Optional.empty();
  }

  /** A number, or one plus or minus a number or a cell. */
  private static boolean isShare(Expr share) {
    boolean aroundOne =
        Parts.addends(share).size() == 2
            && Parts.addends(share).get(0).node() instanceof Expr.Num one
            && one.value() == 1;
    return Parts.isConstant(share) || (aroundOne && Trees.count(share, Parts::refers) == 1);
  }
}
