package weighhouse.rules.file;

import java.util.List;
import java.util.Map;
import weighhouse.quantity.Quantity;

/**
 * A small case that a rule file tells: cells, and what the rule makes of the formula in some of
 * them.
 *
 * @param cells A1 cells or ranges and what they hold
 * @param at A1 range that holds the formula under test
 * @param formula the formula under test
 * @param finds the corrected formula, {@link #SOMETHING} where the rule can give none, or null
 *     where nothing is found
 * @param value corrected value at the first cell; NaN if not told
 * @param cycleYears declared cycle length in years; NaN if not told
 * @param note what the example shows
 * @param line its line in the file, from 1
 */
public record Example(
    Map<String, Cell> cells,
    String at,
    Cell formula,
    String finds,
    double value,
    double cycleYears,
    String note,
    int line) {
  /** Stands for a finding without a corrected formula. */
  public static final String SOMETHING = "something";

  public boolean isFound() {
    return finds != null;
  }

  /**
   * What a cell holds.
   *
   * @param quantity what it is declared to be, or null
   * @param content a number, a text, or a formula with its equals sign
   */
  public record Cell(Quantity quantity, List<String> content) {}
}
