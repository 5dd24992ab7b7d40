package weighhouse.recalculate;

import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * What a what-if replaces. Formulas are relative to the cell that hosts them, so one tree serves a
 * whole range.
 *
 * @param values cells that get a constant
 * @param formulas ranges whose cells get a formula
 */
public record Change(Map<CellAddress, Value> values, Map<CellRange, Expr> formulas) {
  public Change {
    values = Map.copyOf(values);
    formulas = Map.copyOf(formulas);
  }

  /** A change of one input. */
  public static Change of(CellAddress cell, double number) {
    return new Change(Map.of(cell, new Value.Num(number)), Map.of());
  }
}
