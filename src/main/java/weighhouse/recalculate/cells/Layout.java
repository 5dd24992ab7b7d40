package weighhouse.recalculate.cells;

import weighhouse.workbook.CellRange;

/**
 * Where cells have their slots. A sheet is cut into lines, its columns or (where it runs across)
 * its rows; the used stretches of a line have consecutive slots, so a formula filled along a line
 * finds what it reads at a fixed distance. Slot {@link #NOWHERE} stands for all cells that have
 * none and is always blank. Immutable.
 */
public final class Layout {
  /** The slot of cells that have none of their own. */
  public static final int NOWHERE = 0;

  /** By sheet, by line: triples of first position, last position, slot of the first. */
  private final int[][][] stretches;

  private final boolean[] across;
  private final int[] rows;
  private final int[] columns;
  private final int slots;

  Layout(int[][][] stretches, boolean[] across, int[] rows, int[] columns, int slots) {
    this.stretches = stretches;
    this.across = across;
    this.rows = rows;
    this.columns = columns;
    this.slots = slots;
  }

  /** Number of slots, {@link #NOWHERE} included. */
  public int slots() {
    return slots;
  }

  public int sheets() {
    return stretches.length;
  }

  /** Whether the sheet's lines are its rows. */
  public boolean across(int sheet) {
    return across[sheet];
  }

  /** One more than the last row that has a slot. */
  public int rows(int sheet) {
    return rows[sheet];
  }

  /** One more than the last column that has a slot. */
  public int columns(int sheet) {
    return columns[sheet];
  }

  /** Slot of a cell, or {@link #NOWHERE}. */
  public int slot(int sheet, int row, int column) {
    int[] line = across[sheet] ? line(sheet, row) : line(sheet, column);
    int position = across[sheet] ? column : row;
    for (int k = 0; k < line.length; k += 3) {
      if (position <= line[k + 1]) {
        return position >= line[k] ? line[k + 2] + position - line[k] : NOWHERE;
      }
    }
    return NOWHERE;
  }

  private static final int[] EMPTY = {};

  private int[] line(int sheet, int line) {
    int[][] lines = stretches[sheet];
    return line >= 0 && line < lines.length && lines[line] != null ? lines[line] : EMPTY;
  }

  /** What is done with consecutive slots of a rectangle. */
  @FunctionalInterface
  public interface Run {
    /** Slots from one up to, not including, another; false to stop. */
    boolean slots(int from, int to);
  }

  /** Passes all slots of a rectangle line by line, until one run says stop. */
  public boolean runs(CellRange range, Run run) {
    int sheet = range.sheet();
    boolean rowwise = across[sheet];
    int firstLine = rowwise ? range.firstRow() : range.firstColumn();
    int lastLine = rowwise ? range.lastRow() : range.lastColumn();
    int first = rowwise ? range.firstColumn() : range.firstRow();
    int last = rowwise ? range.lastColumn() : range.lastRow();
    int end = Math.min(lastLine, stretches[sheet].length - 1);
    for (int at = Math.max(0, firstLine); at <= end; at++) {
      if (!runs(line(sheet, at), first, last, run)) {
        return false;
      }
    }
    return true;
  }

  private static boolean runs(int[] line, int first, int last, Run run) {
    for (int k = 0; k < line.length && line[k] <= last; k += 3) {
      int from = Math.max(first, line[k]);
      int to = Math.min(last, line[k + 1]);
      if (from <= to && !run.slots(line[k + 2] + from - line[k], line[k + 2] + to + 1 - line[k])) {
        return false;
      }
    }
    return true;
  }

  /** The cells of a line from one position to another have consecutive slots. */
  public boolean together(int sheet, int line, int first, int last) {
    int[] stretch = line(sheet, line);
    for (int k = 0; k < stretch.length; k += 3) {
      if (first >= stretch[k] && last <= stretch[k + 1]) {
        return true;
      }
    }
    return false;
  }
}
