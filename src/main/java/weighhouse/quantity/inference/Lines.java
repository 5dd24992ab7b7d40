package weighhouse.quantity.inference;

import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * A direction in which cycles follow each other.
 *
 * @param down whether cycles go down the rows and states across, or the other way round
 */
record Lines(boolean down) {
  /** How many cells of a unit follow each other. */
  int length(CellRange range) {
    return down ? range.rows() : range.columns();
  }

  /** Whether a unit is one cell wide across the direction. */
  boolean isLine(CellRange range) {
    return (down ? range.columns() : range.rows()) == 1;
  }

  /** The cell so many cycles later. */
  CellAddress later(CellAddress cell, int cycles) {
    return down ? cell.offset(cycles, 0) : cell.offset(0, cycles);
  }

  /** The cell of the same cycle, so many states further. */
  CellAddress beside(CellAddress cell, int states) {
    return down ? cell.offset(0, states) : cell.offset(states, 0);
  }
}
