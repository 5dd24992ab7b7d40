package weighhouse.rules.check.synthesis;

import java.util.List;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Ratios;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** What the operands of a sum or mean are: ratios of several sources, weights, or neither. */
final class RatioOperands {
  /** More than this are the draws of one ratio or its course over time. */
  private static final int MOST_STUDIES = 40;

  private static final Set<Kind> SHARES = Set.of(Kind.PROPORTION, Kind.OCCUPANCY);

  /** What is multiplied by a ratio in its own right, not to weigh it. */
  private static final Set<Kind> OWN_RIGHT =
      Set.of(Kind.RATE, Kind.PROBABILITY, Kind.CUMULATIVE_HAZARD, Kind.COST, Kind.UTILITY);

  private final ModelView model;

  RatioOperands(ModelView model) {
    this.model = model;
  }

  boolean isRatioCell(Expr node, CellAddress host) {
    return model.cell(node, host) != null && Ratios.isRatio(model.quantity(node, host));
  }

  /** Whether the weights add up to a whole. */
  boolean sumsToOne(List<Expr> weights, CellAddress host) {
    double total = weights.stream().mapToDouble(w -> model.value(w, host)).sum();
    return Math.abs(total - 1) < 1e-6;
  }

  /** Whether the weights are shares of patients. */
  boolean isShare(Expr weights, CellAddress host) {
    CellRange range = weights instanceof Expr.AreaRef area ? range(area, host) : null;
    Quantity quantity =
        range == null ? model.quantity(weights, host) : model.quantity(range.first());
    return SHARES.contains(quantity.kind());
  }

  /** A sum of rates each with a ratio of its own is no mean. */
  boolean isEvent(Expr weights, CellAddress host) {
    return OWN_RIGHT.contains(model.quantity(weights, host).kind());
  }

  /** One ratio, or a range of several that are not one ratio's draws or course. */
  boolean areRatios(Expr node, CellAddress host) {
    if (!(node instanceof Expr.AreaRef area)) {
      return isRatioCell(node, host);
    }
    CellRange range = range(area, host);
    if (range == null || range.size() < 2 || range.size() > MOST_STUDIES) {
      return false;
    }
    for (int row = range.firstRow(); row <= range.lastRow(); row++) {
      for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
        CellAddress cell = new CellAddress(range.sheet(), row, column);
        if (!Ratios.isEstimate(model.quantity(cell)) || isCourse(cell, range)) {
          return false;
        }
      }
    }
    return true;
  }

  /** Whether a formula fills the range: a ratio over time, or repeated draws. */
  private boolean isCourse(CellAddress cell, CellRange range) {
    return model.place(cell).map(place -> place.range().size() >= range.size()).orElse(false)
        && Trees.contains(
            model.formula(cell),
            n -> n instanceof Expr.CellRef ref && ref.row().absolute() && ref.column().absolute());
  }

  private CellRange range(Expr.AreaRef area, CellAddress host) {
    int sheet =
        area.sheet() == null
            ? host.sheet()
            : model.subject().workbook().sheetIndex(area.sheet().first());
    return sheet < 0
        ? null
        : new CellRange(
            sheet,
            area.row1().resolve(host.row()),
            area.column1().resolve(host.column()),
            area.row2().resolve(host.row()),
            area.column2().resolve(host.column()));
  }
}
