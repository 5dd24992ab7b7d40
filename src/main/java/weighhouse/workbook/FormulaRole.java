package weighhouse.workbook;

/** How a cell takes part in a formula. */
public enum FormulaRole {
  /** A constant or blank cell. */
  NONE,
  /** A formula of its own, or one member of a shared formula. */
  PLAIN,
  /** Upper left cell of an array formula entered over a fixed range. */
  ARRAY_ANCHOR,
  /** Another cell of such a range: its value comes from the anchor's formula. */
  ARRAY_MEMBER,
  /** A dynamic array formula, whose result may spill. */
  DYNAMIC_ARRAY,
  /** Filled by Excel's what-if data table: never recalculated here. */
  DATA_TABLE
}
