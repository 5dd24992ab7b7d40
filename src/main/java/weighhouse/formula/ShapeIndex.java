package weighhouse.formula;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.IntStream;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/**
 * Finds the shapes of a workbook: a fast pass over each sheet's formulas gives relative keys, only
 * distinct ones are parsed. Time grows with the formulas' text, memory by two numbers a cell.
 */
public final class ShapeIndex implements Shapes {
  /** From so many stored cells on, sheets are read side by side. */
  private static final int MANY_CELLS = 20_000;

  /** From so many distinct formulas on, they are parsed side by side. */
  private static final int MANY_SHAPES = 500;

  private final Workbook workbook;
  private final List<Shape> shapes = new ArrayList<>();
  private final List<Region> regions = new ArrayList<>();
  private final int[][] shapeOf;
  private final int[][] regionOf;
  private final Map<CellAddress, String> unparsed = new TreeMap<>();

  private ShapeIndex(Workbook workbook) {
    this.workbook = workbook;
    shapeOf = new int[workbook.sheets().size()][];
    regionOf = new int[workbook.sheets().size()][];
    List<SheetKeys> keys = readSheets();
    DistinctFormulas distinct = new DistinctFormulas(workbook, keys);
    distinct.parse(MANY_SHAPES, shapes);
    for (int sheet = 0; sheet < shapeOf.length; sheet++) {
      assign(sheet, keys.get(sheet), distinct);
    }
    findRegions();
  }

  /** Reads every formula of the workbook. */
  public static Shapes of(Workbook workbook) {
    return new ShapeIndex(workbook);
  }

  private List<SheetKeys> readSheets() {
    int cells = workbook.sheets().stream().mapToInt(sheet -> sheet.cells().size()).sum();
    IntStream sheets = IntStream.range(0, shapeOf.length);
    return (cells > MANY_CELLS ? sheets.parallel() : sheets)
        .mapToObj(sheet -> new SheetKeys(workbook.sheet(sheet).cells()))
        .toList();
  }

  private void assign(int sheet, SheetKeys keys, DistinctFormulas distinct) {
    int[] shape = keys.keyOf;
    CellStore cells = workbook.sheet(sheet).cells();
    for (int i = 0; i < shape.length; i++) {
      if (shape[i] != SheetKeys.NONE) {
        int formula = distinct.number(sheet, shape[i]);
        shape[i] = distinct.shape(formula);
        if (shape[i] == SheetKeys.NONE) {
          unparsed.put(
              new CellAddress(sheet, cells.row(i), cells.column(i)), distinct.reason(formula));
        }
      }
    }
    shapeOf[sheet] = shape;
  }

  private void findRegions() {
    for (int sheet = 0; sheet < shapeOf.length; sheet++) {
      RegionFinder finder = new RegionFinder(sheet, workbook.sheet(sheet), shapeOf[sheet]);
      int offset = regions.size();
      regionOf[sheet] = finder.regionOf();
      for (int i = 0; i < regionOf[sheet].length; i++) {
        regionOf[sheet][i] += regionOf[sheet][i] < 0 ? 0 : offset;
      }
      for (Region region : finder.regions()) {
        regions.add(new Region(offset + region.id(), region.shape(), region.range()));
      }
    }
  }

  @Override
  public List<Shape> all() {
    return Collections.unmodifiableList(shapes);
  }

  @Override
  public List<Region> regions() {
    return Collections.unmodifiableList(regions);
  }

  @Override
  public int shapeOf(int sheet, int cellIndex) {
    return shapeOf[sheet][cellIndex];
  }

  @Override
  public Shape at(CellAddress cell) {
    int id = lookUp(shapeOf, cell);
    return id < 0 ? null : shapes.get(id);
  }

  @Override
  public Region regionAt(CellAddress cell) {
    int id = lookUp(regionOf, cell);
    return id < 0 ? null : regions.get(id);
  }

  private int lookUp(int[][] table, CellAddress cell) {
    int index = workbook.sheet(cell.sheet()).cells().find(cell.row(), cell.column());
    return index < 0 ? SheetKeys.NONE : table[cell.sheet()][index];
  }

  @Override
  public Map<CellAddress, String> unparsed() {
    return Collections.unmodifiableMap(unparsed);
  }
}
