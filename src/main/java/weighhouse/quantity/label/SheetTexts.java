package weighhouse.quantity.label;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Sheet;

/** The texts of one sheet, laid out so that the nearest to a cell is found without a search. */
final class SheetTexts {
  /** Merged texts over more columns are titles of the whole sheet. */
  private static final int WIDEST_HEADING = 60;

  private final CellStore cells;
  private final Map<Integer, int[]> rowsOfColumn = new HashMap<>();
  private final Map<Integer, int[]> columnsOfRow = new HashMap<>();
  private final Map<Long, String> merged = new HashMap<>();
  private final TitleRows titles = new TitleRows();

  SheetTexts(Sheet sheet) {
    cells = sheet.cells();
    Places byColumn = new Places();
    Places byRow = new Places();
    for (int i = 0; i < cells.size(); i++) {
      if (isText(i)) {
        byColumn.add(cells.column(i), cells.row(i));
        byRow.add(cells.row(i), cells.column(i));
      }
    }
    spread(sheet, byColumn);
    byColumn.sortInto(rowsOfColumn);
    byRow.sortInto(columnsOfRow);
    titles.find(this, cells);
  }

  private void spread(Sheet sheet, Places byColumn) {
    for (CellRange range : sheet.merged()) {
      int index = cells.find(range.firstRow(), range.firstColumn());
      if (index >= 0 && isText(index) && range.columns() <= WIDEST_HEADING) {
        for (int column = range.firstColumn() + 1; column <= range.lastColumn(); column++) {
          merged.put(key(range.firstRow(), column), cells.text(index));
          byColumn.add(column, range.firstRow());
        }
      }
    }
  }

  private static long key(int row, int column) {
    return ((long) row << 20) | column;
  }

  boolean isText(int index) {
    return cells.kind(index) == CellKind.TEXT && !cells.text(index).isBlank();
  }

  /** The text at a cell, or null; a merged heading stands in every column that it covers. */
  String at(int row, int column) {
    int index = cells.find(row, column);
    if (index >= 0 && isText(index)) {
      return cells.text(index);
    }
    return merged.isEmpty() ? null : merged.get(key(row, column));
  }

  /** Whether a number stands there, or a formula that gives no text. */
  boolean isNumber(int row, int column) {
    int index = cells.find(row, column);
    return index >= 0
        && !isText(index)
        && (cells.kind(index) == CellKind.NUMBER || cells.hasFormula(index));
  }

  boolean isBlank(int row, int column) {
    return at(row, column) == null && !isNumber(row, column);
  }

  /** Row of the nearest text above in the column, or -1. */
  int textAbove(int row, int column) {
    return below(rowsOfColumn.get(column), row);
  }

  /** Column of the nearest text on the left in the row, or -1. */
  int textLeft(int row, int column) {
    return below(columnsOfRow.get(row), column);
  }

  /** Column of the nearest text on the right in the row, or -1. */
  int textRight(int row, int column) {
    int[] columns = columnsOfRow.get(row);
    if (columns == null) {
      return -1;
    }
    int at = Arrays.binarySearch(columns, column + 1);
    int index = at < 0 ? -at - 1 : at;
    return index < columns.length ? columns[index] : -1;
  }

  /** Whether the row holds any text. */
  boolean hasText(int row) {
    return columnsOfRow.containsKey(row);
  }

  TitleRows titles() {
    return titles;
  }

  static int below(int[] sorted, int value) {
    if (sorted == null) {
      return -1;
    }
    int at = Arrays.binarySearch(sorted, value);
    int index = (at < 0 ? -at - 1 : at) - 1;
    return index < 0 ? -1 : sorted[index];
  }
}
