package weighhouse.recalculate.cells;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Grid;
import weighhouse.workbook.CellRange;

/** A rectangle of cells as a function reads it; its used part ends with the sheet's. */
public record CellGrid(Layout layout, CellState state, CellRange range) implements Grid {
  @Override
  public int rows() {
    return range.rows();
  }

  @Override
  public int columns() {
    return range.columns();
  }

  @Override
  public int usedRows() {
    int used = layout.rows(range.sheet()) - range.firstRow();
    return Math.max(0, Math.min(range.rows(), used));
  }

  @Override
  public int usedColumns() {
    int used = layout.columns(range.sheet()) - range.firstColumn();
    return Math.max(0, Math.min(range.columns(), used));
  }

  @Override
  public Value at(int row, int column) {
    return state.get(slot(row, column));
  }

  @Override
  public double number(int row, int column) {
    int slot = slot(row, column);
    return state.isNumber(slot) ? state.numbers[slot] : Double.NaN;
  }

  @Override
  public double arithmetic(int row, int column) {
    return state.numbers[slot(row, column)];
  }

  private int slot(int row, int column) {
    return layout.slot(range.sheet(), range.firstRow() + row, range.firstColumn() + column);
  }
}
