package weighhouse.rules.check.ratio;

import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * A formula and the cells it fills.
 *
 * @param range cells of that one formula
 * @param tree the formula
 */
public record Place(CellRange range, Expr tree) {
  /** The cell that references are read from. */
  public CellAddress host() {
    return range.first();
  }
}
