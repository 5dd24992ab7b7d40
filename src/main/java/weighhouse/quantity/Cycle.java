package weighhouse.quantity;

import java.util.List;
import weighhouse.workbook.CellAddress;

/**
 * The model's cycle length as the workbook tells it.
 *
 * @param years its length in years; NaN where the workbook does not tell
 * @param inputs cells that hold it or its inverse; empty where it is only told in words or by
 *     columns
 * @param evidence one sentence each
 */
public record Cycle(double years, List<CellAddress> inputs, List<String> evidence) {
  public boolean known() {
    return !Double.isNaN(years);
  }
}
