package weighhouse.formula;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Sheet;

/**
 * Cuts one sheet into rectangles of one shape: vertical strips column by column, equal strips side
 * by side merged. Array formulas over several cells are rectangles of their own.
 */
final class RegionFinder {
  private static final int NONE = -1;

  private final int sheetIndex;
  private final CellStore cells;
  private final int[] shapeOf;
  private final Part[] partOf;
  private final List<Part> parts = new ArrayList<>();
  private final List<Region> regions = new ArrayList<>();

  RegionFinder(int sheetIndex, Sheet sheet, int[] shapeOf) {
    this.sheetIndex = sheetIndex;
    this.cells = sheet.cells();
    this.shapeOf = shapeOf;
    partOf = new Part[shapeOf.length];
    sheet.arrays().forEach(this::addArray);
    mergeSideBySide(strips());
    number();
  }

  /** Regions ordered by row, then column, numbered from 0. */
  List<Region> regions() {
    return regions;
  }

  /** Number of the region of each stored cell, or -1. */
  int[] regionOf() {
    int[] regionOf = new int[partOf.length];
    for (int i = 0; i < partOf.length; i++) {
      regionOf[i] = partOf[i] == null ? NONE : partOf[i].whole.id;
    }
    return regionOf;
  }

  private void addArray(CellRange range) {
    int anchor = cells.find(range.firstRow(), range.firstColumn());
    if (range.size() == 1 || anchor < 0 || shapeOf[anchor] < 0) {
      return;
    }
    Part part = new Part(shapeOf[anchor], range.firstRow(), range.firstColumn());
    part.lastRow = range.lastRow();
    part.lastColumn = range.lastColumn();
    parts.add(part);
    int end = cells.firstOfRow(range.lastRow() + 1);
    for (int i = cells.firstOfRow(range.firstRow()); i < end; i++) {
      if (cells.column(i) >= range.firstColumn() && cells.column(i) <= range.lastColumn()) {
        partOf[i] = part;
      }
    }
  }

  private List<Part> strips() {
    List<Part> strips = new ArrayList<>();
    Part[] open = new Part[cells.columns()];
    for (int i = 0; i < shapeOf.length; i++) {
      if (shapeOf[i] < 0 || partOf[i] != null) {
        continue;
      }
      int row = cells.row(i);
      int column = cells.column(i);
      Part strip = open[column];
      if (strip == null || strip.shape != shapeOf[i] || strip.lastRow != row - 1) {
        strip = new Part(shapeOf[i], row, column);
        open[column] = strip;
        strips.add(strip);
      }
      strip.lastRow = row;
      partOf[i] = strip;
    }
    return strips;
  }

  private void mergeSideBySide(List<Part> strips) {
    strips.sort(
        Comparator.comparingInt((Part p) -> p.firstRow)
            .thenComparingInt(p -> p.lastRow)
            .thenComparingInt(p -> p.shape)
            .thenComparingInt(p -> p.firstColumn));
    Part last = null;
    for (Part strip : strips) {
      if (last != null && last.isBeside(strip)) {
        last.lastColumn = strip.firstColumn;
        strip.whole = last;
      } else {
        parts.add(strip);
        last = strip;
      }
    }
  }

  private void number() {
    parts.sort(
        Comparator.comparingInt((Part p) -> p.firstRow).thenComparingInt(p -> p.firstColumn));
    for (Part part : parts) {
      part.id = regions.size();
      CellRange range =
          new CellRange(sheetIndex, part.firstRow, part.firstColumn, part.lastRow, part.lastColumn);
      regions.add(new Region(part.id, part.shape, range));
    }
  }

  /** A rectangle that still grows. */
  private static final class Part {
    private final int shape;
    private final int firstRow;
    private final int firstColumn;
    private int lastRow;
    private int lastColumn;
    private int id;
    private Part whole = this;

    Part(int shape, int row, int column) {
      this.shape = shape;
      firstRow = row;
      lastRow = row;
      firstColumn = column;
      lastColumn = column;
    }

    boolean isBeside(Part strip) {
      return shape == strip.shape
          && firstRow == strip.firstRow
          && lastRow == strip.lastRow
          && lastColumn == strip.firstColumn - 1;
    }
  }
}
