package weighhouse.rules.check.uncertainty;

import java.util.List;
import weighhouse.effect.estimate.LogSymmetry;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.check.ratio.Estimate;
import weighhouse.rules.check.ratio.IntervalLevel;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.NearbyTexts;
import weighhouse.workbook.CellAddress;

/** Limits that are not equally far from their ratio on the log scale, beyond rounding. */
public final class IntervalSymmetryCheck extends IntervalCheck {
  /** A share of the ratio that no one would see. */
  private static final double UNSEEN = 0.002;

  private static final List<Double> PLAIN_RANGES =
      List.of(0.05, 0.1, 0.15, 0.2, 0.25, 0.3, 0.4, 0.5);

  @Override
  public String name() {
    return "interval-log-symmetry";
  }

  @Override
  String fault(Estimate estimate, Printed printed, ModelView model) {
    LogSymmetry symmetry = printed.symmetry();
    boolean inOrder = printed.lower() < printed.ratio() && printed.ratio() < printed.upper();
    boolean close = Math.abs(symmetry.estimate() / printed.ratio() - 1) < UNSEEN;
    if (symmetry.holds() || close || !inOrder || isRange(estimate, printed, model)) {
      return null;
    }
    return "For "
        + printed.show(printed.ratio())
        + " to lie midway between its limits on the log scale, either the ratio would have to be "
        + printed.show(symmetry.estimate())
        + ", or the lower limit "
        + printed.show(symmetry.lower())
        + ", or the upper limit "
        + printed.show(symmetry.upper())
        + ".";
  }

  /** So many per cent up and down is a range of its own, not an interval. */
  private static boolean isRange(Estimate estimate, Printed printed, ModelView model) {
    double down = 1 - printed.lower() / printed.ratio();
    double up = printed.upper() / printed.ratio() - 1;
    double slack = printed.half() / printed.ratio();
    boolean typed =
        model.formula(estimate.lower()) == null && model.formula(estimate.upper()) == null;
    boolean plain =
        typed
            && PLAIN_RANGES.stream()
                .anyMatch(p -> Math.abs(down - p) <= slack && Math.abs(up - p) <= slack);
    boolean share = isShare(estimate.lower(), model) || isShare(estimate.upper(), model);
    return (plain || share) && !saysInterval(estimate, model);
  }

  private static boolean saysInterval(Estimate estimate, ModelView model) {
    IntervalLevel level = new IntervalLevel(new NearbyTexts(model.subject().workbook()));
    return level.of(List.of(estimate.lower(), estimate.upper())).isPresent();
  }

  private static boolean isShare(CellAddress limit, ModelView model) {
    Expr formula = model.formula(limit);
    return formula != null && RangeFactor.of(Trees.inside(formula), limit, model).isPresent();
  }
}
