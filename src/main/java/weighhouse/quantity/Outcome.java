package weighhouse.quantity;

import weighhouse.workbook.CellAddress;

/**
 * A result of the model: told by its label and by being an end of the calculation.
 *
 * @param cell where it stands
 * @param kind COST, QALY, LIFE_YEARS, ICER or NET_BENEFIT
 * @param incremental whether it compares two arms (an ICER always does)
 * @param label for people
 */
public record Outcome(CellAddress cell, Kind kind, boolean incremental, String label) {}
