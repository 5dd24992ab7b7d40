package weighhouse.recalculate;

import weighhouse.workbook.CellAddress;

/** The values of a workbook's cells after one calculation. Immutable, cheap to hold. */
public interface Values {
  Value at(CellAddress cell);

  /** The number at a cell as arithmetic sees it: blank 0, TRUE 1; NaN for text and errors. */
  default double number(CellAddress cell) {
    return at(cell).number();
  }
}
