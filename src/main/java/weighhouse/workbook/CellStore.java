package weighhouse.workbook;

/**
 * The stored cells of one sheet in typed arrays, ordered by row, then column. A cell is spoken of
 * by its index in that order, from 0 to {@link #size()} - 1; blank cells without a formula are not
 * stored. Immutable.
 */
public interface CellStore {
  int size();

  /** Index of the cell, or a negative number where nothing is stored. */
  int find(int row, int column);

  int row(int index);

  int column(int index);

  /** Kind of the constant, or of the formula's stored result. */
  CellKind kind(int index);

  /** The number; 1 or 0 of a boolean; NaN of all else. */
  double number(int index);

  /** The text, or the code of an error such as {@code #DIV/0!}; null of all else. */
  String text(int index);

  /** Excel's number format, such as {@code 0.0%}; {@code General} where none is set. */
  String numberFormat(int index);

  FormulaRole role(int index);

  default boolean hasFormula(int index) {
    return role(index) != FormulaRole.NONE;
  }

  /**
   * The formula as written at its anchor, without the equals sign; null of constants and data
   * tables. Members of a shared or array formula give the anchor's text.
   */
  String formula(int index);

  /** Row of the cell that {@link #formula} is written for; the cell's own row unless shared. */
  int anchorRow(int index);

  /** Column of the cell that {@link #formula} is written for. */
  int anchorColumn(int index);

  /**
   * First index stored in or after that row: the cells of row r are [firstOfRow(r),
   * firstOfRow(r+1)).
   */
  int firstOfRow(int row);

  /** One more than the last used row. */
  int rows();

  /** One more than the last used column. */
  int columns();
}
