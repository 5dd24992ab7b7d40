package weighhouse.workbook;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Fills a cell store. Each cell is begun, given a value and a formula as it has them, and ended; a
 * cell that got neither is not stored. Cells may come in any order; of two for one address the
 * later stays. For one thread.
 */
public final class CellsBuilder {
  private record Area(int firstRow, int firstColumn, int lastRow, int lastColumn, int group) {}

  private static final int NO_GROUP = -1;

  private final List<String> sharedTexts;
  private final List<String> formats;
  private final Map<String, Integer> ownIds = new HashMap<>();
  private final FormulaTexts formulas = new FormulaTexts();
  private final List<Area> areas = new ArrayList<>();
  private Columns cells = new Columns();
  private long lastKey = -1;
  private boolean inOrder = true;

  /** For cells whose texts are all their own and whose number format is General. */
  public CellsBuilder() {
    this(List.of(), List.of());
  }

  /**
   * @param sharedTexts texts that {@link #sharedText} speaks of; read only when the store is used
   * @param formats number formats that {@link #begin} speaks of
   */
  public CellsBuilder(List<String> sharedTexts, List<String> formats) {
    this.sharedTexts = sharedTexts;
    this.formats = formats;
  }

  /** Starts a cell at a zero-based row and column with the format of that number. */
  public CellsBuilder begin(int row, int column, int format) {
    cells.reserve();
    int i = cells.size;
    cells.row[i] = row;
    cells.column[i] = (char) column;
    cells.format[i] = (char) format;
    cells.setFormula(i, FormulaRole.NONE, 0);
    return value(CellKind.BLANK, 0);
  }

  public CellsBuilder number(double value) {
    return value(CellKind.NUMBER, value);
  }

  public CellsBuilder bool(boolean value) {
    return value(CellKind.BOOLEAN, value ? 1 : 0);
  }

  public CellsBuilder text(String text) {
    return value(CellKind.TEXT, ownId(text));
  }

  /** The text of that number in the list given to the constructor. */
  public CellsBuilder sharedText(int id) {
    return value(CellKind.TEXT, id);
  }

  /** An error by its code, such as {@code #N/A}. */
  public CellsBuilder error(String code) {
    return value(CellKind.ERROR, ownId(code));
  }

  /** A formula that is written for this cell, without the equals sign. */
  public CellsBuilder formula(String text) {
    return formula(text.toCharArray(), 0, text.length());
  }

  /** The same from a part of an array. */
  public CellsBuilder formula(char[] text, int start, int length) {
    int id = formulas.texts.intern(text, start, length);
    cells.setFormula(cells.size, FormulaRole.PLAIN, id + 1);
    return this;
  }

  /** A new formula for several cells; its text may follow later. */
  public int newGroup() {
    return formulas.newGroup();
  }

  /** Gives the group its text, written for the cell at hand. */
  public void define(int group, char[] text, int start, int length) {
    int id = formulas.texts.intern(text, start, length);
    formulas.define(group, id, cells.row[cells.size], cells.column[cells.size]);
  }

  /** Gives the group its text, written for the cell at hand. */
  public void define(int group, String text) {
    define(group, text.toCharArray(), 0, text.length());
  }

  /** Whether the group has its text. */
  public boolean isDefined(int group) {
    return formulas.isDefined(group);
  }

  /** The cell at hand takes its formula from the group. */
  public CellsBuilder member(int group, FormulaRole role) {
    cells.setFormula(cells.size, role, ~group);
    return this;
  }

  /** The other cells of this area are filled by the array formula of the group. */
  public void array(CellRange area, int group) {
    areas.add(area(area, group));
  }

  /** The cells of this area are filled by a data table. */
  public void dataTable(CellRange area) {
    areas.add(area(area, NO_GROUP));
  }

  /** Ends the cell at hand. */
  public void end() {
    int i = cells.size;
    if (cells.kind(i) == CellKind.BLANK && cells.role(i) == FormulaRole.NONE) {
      return;
    }
    long key = (long) cells.row[i] << 14 | cells.column[i];
    inOrder &= key > lastKey;
    lastKey = key;
    cells.size++;
  }

  /** The filled store; nothing may be added afterwards. */
  public CellStore build() {
    if (!inOrder) {
      cells = cells.sorted();
    }
    cells.trim();
    formulas.texts.seal();
    RowIndex index = new RowIndex(cells.row, cells.size);
    areas.forEach(area -> fill(area, index));
    String[] own = new String[ownIds.size()];
    ownIds.forEach((text, id) -> own[~id] = text);
    return new PackedCells(cells, index, formulas, sharedTexts, own, formats);
  }

  /**
   * Takes the formula from cells whose group never got a text; they keep their stored value.
   *
   * @return how many there were
   */
  public int dropUndefined() {
    int dropped = 0;
    for (int i = 0; i < cells.size; i++) {
      if (cells.formula[i] < 0 && !formulas.isDefined(~cells.formula[i])) {
        cells.setFormula(i, FormulaRole.NONE, 0);
        dropped++;
      }
    }
    return dropped;
  }

  private CellsBuilder value(CellKind kind, double payload) {
    cells.setValue(cells.size, kind, payload);
    return this;
  }

  /** Complements of 0, 1, 2 ... so that they differ from the ids of shared texts. */
  private int ownId(String text) {
    Integer known = ownIds.putIfAbsent(text, ~ownIds.size());
    return known == null ? ~(ownIds.size() - 1) : known;
  }

  private static Area area(CellRange range, int group) {
    return new Area(
        range.firstRow(), range.firstColumn(), range.lastRow(), range.lastColumn(), group);
  }

  private void fill(Area area, RowIndex index) {
    FormulaRole role = area.group == NO_GROUP ? FormulaRole.DATA_TABLE : FormulaRole.ARRAY_MEMBER;
    int end = index.firstOf(area.lastRow + 1);
    for (int i = index.firstOf(area.firstRow); i < end; i++) {
      boolean inside = cells.column[i] >= area.firstColumn && cells.column[i] <= area.lastColumn;
      if (inside && cells.role(i) == FormulaRole.NONE) {
        cells.setFormula(i, role, area.group == NO_GROUP ? 0 : ~area.group);
      }
    }
  }
}
