package weighhouse.workbook;

import java.util.Arrays;
import java.util.List;

/** The cell store in arrays: 21 bytes a cell, and what its distinct texts take. */
final class PackedCells implements CellStore {
  private final Columns cells;
  private final RowIndex index;
  private final FormulaTexts formulas;
  private final List<String> sharedTexts;
  private final String[] ownTexts;
  private final List<String> formats;
  private final int columns;

  PackedCells(
      Columns cells,
      RowIndex index,
      FormulaTexts formulas,
      List<String> sharedTexts,
      String[] ownTexts,
      List<String> formats) {
    this.cells = cells;
    this.index = index;
    this.formulas = formulas;
    this.sharedTexts = sharedTexts;
    this.ownTexts = ownTexts;
    this.formats = formats;
    int last = -1;
    for (int i = 0; i < cells.size; i++) {
      last = Math.max(last, cells.column[i]);
    }
    this.columns = last + 1;
  }

  @Override
  public int size() {
    return cells.size;
  }

  @Override
  public int find(int row, int column) {
    int position = index.position(row);
    if (position < 0 || column < 0 || column >= columns) {
      return -1;
    }
    int start = index.start(position);
    int end = index.end(position);
    if (column < cells.column[start]) {
      return -1;
    }
    int most = Math.min(end - 1, start + column - cells.column[start]);
    return cells.column[most] == column
        ? most
        : Arrays.binarySearch(cells.column, start, most + 1, (char) column);
  }

  @Override
  public int row(int index) {
    return cells.row[index];
  }

  @Override
  public int column(int index) {
    return cells.column[index];
  }

  @Override
  public CellKind kind(int index) {
    return cells.kind(index);
  }

  @Override
  public double number(int index) {
    CellKind kind = kind(index);
    return kind == CellKind.NUMBER || kind == CellKind.BOOLEAN ? cells.payload[index] : Double.NaN;
  }

  @Override
  public String text(int index) {
    CellKind kind = kind(index);
    if (kind != CellKind.TEXT && kind != CellKind.ERROR) {
      return null;
    }
    int id = (int) cells.payload[index];
    return id < 0 ? ownTexts[~id] : sharedTexts.get(id);
  }

  @Override
  public String numberFormat(int index) {
    int format = cells.format[index];
    return format < formats.size() ? formats.get(format) : "General";
  }

  @Override
  public FormulaRole role(int index) {
    return cells.role(index);
  }

  @Override
  public String formula(int index) {
    int formula = cells.formula[index];
    if (formula == 0) {
      return null;
    }
    return formula > 0 ? formulas.texts.get(formula - 1) : formulas.groupText(~formula);
  }

  @Override
  public int anchorRow(int index) {
    int formula = cells.formula[index];
    return formula < 0 ? formulas.anchorRow(~formula) : cells.row[index];
  }

  @Override
  public int anchorColumn(int index) {
    int formula = cells.formula[index];
    return formula < 0 ? formulas.anchorColumn(~formula) : cells.column[index];
  }

  @Override
  public int firstOfRow(int row) {
    return index.firstOf(row);
  }

  @Override
  public int rows() {
    return index.rows();
  }

  @Override
  public int columns() {
    return columns;
  }
}
