package weighhouse.formula;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.FormulaRole;

/** First pass over one sheet: which cells have formulas of the same relative form. */
final class SheetKeys {
  static final int NONE = -1;

  /** Number of the key of each stored cell, or {@link #NONE}. */
  final int[] keyOf;

  final KeyTable table = new KeyTable();

  /** A cell of each key. */
  final List<Integer> firstCells = new ArrayList<>();

  private final CellStore cells;
  private final RelativeKey scanner = new RelativeKey();

  /** Shared formulas by the place of their anchor: members are not read again. */
  private final Map<Long, Integer> shared = new HashMap<>();

  SheetKeys(CellStore cells) {
    this.cells = cells;
    keyOf = new int[cells.size()];
    Arrays.fill(keyOf, NONE);
    for (int i = 0; i < keyOf.length; i++) {
      if (cells.hasFormula(i) && cells.role(i) != FormulaRole.DATA_TABLE) {
        keyOf[i] = key(i);
      }
    }
  }

  private int key(int cell) {
    int row = cells.anchorRow(cell);
    int column = cells.anchorColumn(cell);
    boolean member = row != cells.row(cell) || column != cells.column(cell);
    return member
        ? shared.computeIfAbsent(((long) row << 14) | column, anchor -> scanned(cell, row, column))
        : scanned(cell, row, column);
  }

  private int scanned(int cell, int row, int column) {
    String text = cells.formula(cell);
    if (text == null) {
      return NONE;
    }
    scanner.write(text, row, column, isArray(cells.role(cell)));
    int id = table.add(scanner.chars(), scanner.length());
    if (id == firstCells.size()) {
      firstCells.add(cell);
    }
    return id;
  }

  static boolean isArray(FormulaRole role) {
    return role == FormulaRole.ARRAY_ANCHOR
        || role == FormulaRole.ARRAY_MEMBER
        || role == FormulaRole.DYNAMIC_ARRAY;
  }
}
