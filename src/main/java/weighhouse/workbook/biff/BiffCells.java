package weighhouse.workbook.biff;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.FormulaError;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.CellsBuilder;
import weighhouse.workbook.FormulaRole;

/** Puts the cells of POI's model into a cell store. */
final class BiffCells {
  private final CellsBuilder cells;
  private final int sheet;
  private final List<CellRange> dataTables;
  private final Map<CellRange, Integer> arrayGroups = new HashMap<>();
  private final List<CellRange> arrays = new ArrayList<>();
  private int unreadable;

  BiffCells(List<String> formats, int sheet, List<CellRange> dataTables) {
    this.cells = new CellsBuilder(List.of(), formats);
    this.sheet = sheet;
    this.dataTables = dataTables;
    dataTables.forEach(cells::dataTable);
  }

  CellStore build() {
    return cells.build();
  }

  List<CellRange> arrays() {
    return arrays;
  }

  /** How many cells kept their stored value only. */
  int unreadable() {
    return unreadable;
  }

  void add(Cell cell) {
    cells.begin(cell.getRowIndex(), cell.getColumnIndex(), cell.getCellStyle().getIndex());
    boolean hasFormula = cell.getCellType() == CellType.FORMULA;
    value(cell, hasFormula ? cell.getCachedFormulaResultType() : cell.getCellType());
    if (hasFormula && !inDataTable(cell)) {
      try {
        formula(cell);
      } catch (RuntimeException e) {
        unreadable++; // a token that POI does not know: the cell is read as its stored value
      }
    }
    cells.end();
  }

  private void value(Cell cell, CellType type) {
    switch (type) {
      case NUMERIC -> cells.number(cell.getNumericCellValue());
      case STRING -> cells.text(cell.getStringCellValue());
      case BOOLEAN -> cells.bool(cell.getBooleanCellValue());
      case ERROR -> cells.error(FormulaError.forInt(cell.getErrorCellValue()).getString());
      default -> {
        // blank
      }
    }
  }

  private void formula(Cell cell) {
    if (!cell.isPartOfArrayFormulaGroup()) {
      cells.formula(cell.getCellFormula());
      return;
    }
    CellRange range = BiffSheet.range(cell.getArrayFormulaRange(), sheet);
    Integer group = arrayGroups.get(range);
    if (group == null) {
      group = cells.newGroup();
      cells.define(group, cell.getCellFormula());
      arrayGroups.put(range, group);
      arrays.add(range);
      cells.member(group, FormulaRole.ARRAY_ANCHOR);
    } else {
      cells.member(group, FormulaRole.ARRAY_MEMBER);
    }
  }

  private boolean inDataTable(Cell cell) {
    return dataTables.stream()
        .anyMatch(
            t ->
                cell.getRowIndex() >= t.firstRow()
                    && cell.getRowIndex() <= t.lastRow()
                    && cell.getColumnIndex() >= t.firstColumn()
                    && cell.getColumnIndex() <= t.lastColumn());
  }
}
