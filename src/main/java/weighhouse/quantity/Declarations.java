package weighhouse.quantity;

import java.util.Map;
import weighhouse.workbook.CellRange;

/**
 * What the reviewer declares about the workbook; stronger than all that is inferred.
 *
 * @param quantities declared quantity of ranges
 * @param cycleYears declared cycle length in years, or NaN
 */
public record Declarations(Map<CellRange, Quantity> quantities, double cycleYears) {
  public static final Declarations NONE = new Declarations(Map.of(), Double.NaN);
}
