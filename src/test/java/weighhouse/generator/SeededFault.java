package weighhouse.generator;

import java.util.List;

/**
 * A fault that the generator put into a workbook.
 *
 * @param rule id of the rule that should find it
 * @param note the disguise
 * @param cells root cells as ranges, {@code 'Sheet 1'!D5:D20}
 * @param formula formula at the first root cell
 * @param expectedFormula the twin's formula at the first root cell
 * @param expected the twin's values at the first, the middle and the last root cell, where the twin
 *     was recalculated
 */
public record SeededFault(
    String rule,
    String note,
    List<String> cells,
    String formula,
    String expectedFormula,
    List<CellValue> expected) {
  /** A cell with its value. */
  public record CellValue(String cell, double value) {}
}
