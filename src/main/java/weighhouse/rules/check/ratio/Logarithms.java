package weighhouse.rules.check.ratio;

import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;

/** Tells logarithms of ratios, which often stand in a row labelled as the ratio. */
public final class Logarithms {
  private static final int ACROSS = 8;
  private static final double SAME_WITHIN = 0.005;

  private final ModelView model;

  public Logarithms(ModelView model) {
    this.model = model;
  }

  /**
   * Whether an expression is a logarithm: by what it is called, how it is made or what it equals.
   */
  public boolean isLog(Expr node, CellAddress host) {
    CellAddress cell = model.cell(node, host);
    return Ratios.isLog(model.quantity(node, host))
        || takesLog(node)
        || model.value(node, host) <= 0
        || (cell != null && (isMadeAsLog(cell) || equalsLogBeside(cell)));
  }

  private static boolean takesLog(Expr node) {
    return Trees.contains(node, n -> n instanceof Expr.Call call && call.function().equals("LN"));
  }

  private boolean isMadeAsLog(CellAddress cell) {
    Expr formula = model.formula(cell);
    return formula != null && Parts.results(formula).stream().anyMatch(Logarithms::takesLog);
  }

  /** A typed-in parameter that is the logarithm of a ratio in its own row. */
  private boolean equalsLogBeside(CellAddress cell) {
    double value = model.value(cell);
    for (int step = 1; step <= ACROSS; step++) {
      for (int sign : new int[] {-1, 1}) {
        CellAddress other = cell.offset(0, sign * step);
        boolean ratio = other.column() >= 0 && Ratios.isEstimate(model.quantity(other));
        if (ratio && Math.abs(Math.log(model.value(other)) - value) < SAME_WITHIN) {
          return true;
        }
      }
    }
    return false;
  }
}
