package weighhouse.recalculate.order;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.function.BiConsumer;
import weighhouse.recalculate.program.Footprint;
import weighhouse.workbook.CellRange;

/** Units in an order in which each comes after all that it reads. Immutable. */
public final class Plan {
  /** One read of a unit. */
  private record Read(int unit, Footprint footprint) {}

  private final List<Unit> units;
  private final List<Step> steps = new ArrayList<>();
  private final int[] stepOf;
  private final int[] placeOf;
  private final List<int[]> unitsOfStep;
  private final List<Read> reads = new ArrayList<>();
  private final RectIndex[] unitsBySheet;
  private final RectIndex[] readsBySheet;
  private final Pointers pointers;

  /**
   * @param pointers what cells read that only shows when they run
   */
  public Plan(List<Unit> units, int sheets, Pointers pointers) {
    this.units = List.copyOf(units);
    this.pointers = pointers;
    this.stepOf = new int[units.size()];
    this.placeOf = new int[units.size()];
    this.unitsBySheet = new RectIndex[sheets];
    this.readsBySheet = new RectIndex[sheets];
    Arrays.fill(stepOf, -1);
    indexUnits();
    indexReads();
    unitsOfStep = Components.of(sources());
    for (int[] component : unitsOfStep) {
      for (int place = 0; place < component.length; place++) {
        stepOf[component[place]] = steps.size();
        placeOf[component[place]] = place;
      }
      steps.add(step(component));
    }
  }

  private void indexUnits() {
    Boxes boxes = new Boxes(unitsBySheet.length);
    for (int u = 0; u < units.size(); u++) {
      boxes.add(units.get(u).hosts(), u);
    }
    boxes.index(unitsBySheet);
  }

  private void indexReads() {
    Boxes boxes = new Boxes(readsBySheet.length);
    for (int u = 0; u < units.size(); u++) {
      for (Footprint read : readsOf(u)) {
        boxes.add(read.hull(units.get(u).seenFrom()), reads.size());
        reads.add(new Read(u, read));
      }
    }
    boxes.index(readsBySheet);
  }

  private List<Footprint> readsOf(int unit) {
    List<Footprint> pointed = pointers.footprints(units.get(unit));
    if (pointed.isEmpty()) {
      return units.get(unit).reads();
    }
    List<Footprint> all = new ArrayList<>(units.get(unit).reads());
    all.addAll(pointed);
    return all;
  }

  private int[][] sources() {
    int[][] sources = new int[units.size()][];
    int[] seen = new int[units.size()];
    IntList found = new IntList();
    for (int u = 0; u < sources.length; u++) {
      found.clear();
      int mark = u + 1;
      for (Footprint read : readsOf(u)) {
        CellRange hull = read.hull(units.get(u).seenFrom());
        unitsBySheet[hull.sheet()].search(
            hull,
            source -> {
              if (seen[source] != mark) {
                seen[source] = mark;
                found.add(source);
              }
            });
      }
      sources[u] = found.toArray();
    }
    return sources;
  }

  private Step step(int[] component) {
    Unit first = units.get(component[0]);
    if (component.length == 1) {
      Running running = pointers.points(first) ? Running.ANY : Running.of(first);
      if (running != Running.ANY) {
        return new Step.Sweep(first, running == Running.FORWARD);
      }
    }
    return Weave.of(this, component);
  }

  List<CellRange> pointedAt(Unit unit, int cell) {
    return pointers.of(unit, cell);
  }

  static boolean meet(CellRange a, CellRange b) {
    return a.sheet() == b.sheet()
        && a.firstRow() <= b.lastRow()
        && b.firstRow() <= a.lastRow()
        && a.firstColumn() <= b.lastColumn()
        && b.firstColumn() <= a.lastColumn();
  }

  public List<Unit> units() {
    return units;
  }

  public List<Step> steps() {
    return steps;
  }

  /** Position of the step that calculates a unit. */
  public int stepOf(int unit) {
    return stepOf[unit];
  }

  /** Positions in {@link #units()} of the units of a step. */
  public int[] unitsOf(int step) {
    return unitsOfStep.get(step).clone();
  }

  /** The first of {@link #unitsOf}. */
  public int firstUnitOf(int step) {
    return unitsOfStep.get(step)[0];
  }

  /** Position of a unit among the units of its step. */
  int placeOf(int unit) {
    return placeOf[unit];
  }

  /** Units with a cell in the rectangle, by their positions in {@link #units()}. */
  public void unitsIn(CellRange range, java.util.function.IntConsumer found) {
    unitsBySheet[range.sheet()].search(range, found);
  }

  /** Units that read the rectangle, with those of their cells that do (a few more at most). */
  public void readersOf(CellRange range, BiConsumer<Integer, CellRange> found) {
    readsBySheet[range.sheet()].search(
        range,
        number -> {
          Read read = reads.get(number);
          CellRange readers = units.get(read.unit()).readers(read.footprint(), range);
          if (readers != null) {
            found.accept(read.unit(), readers);
          }
        });
  }

  /** Reads that show only when a cell runs, by unit and number of the cell in the unit. */
  public record Pointers(Map<Unit, Map<Integer, List<CellRange>>> byUnit) {
    public static final Pointers NONE = new Pointers(Map.of());

    List<CellRange> of(Unit unit, int cell) {
      return byUnit.getOrDefault(unit, Map.of()).getOrDefault(cell, List.of());
    }

    boolean points(Unit unit) {
      return byUnit.containsKey(unit);
    }

    List<Footprint> footprints(Unit unit) {
      return byUnit.getOrDefault(unit, Map.of()).values().stream()
          .flatMap(List::stream)
          .distinct()
          .map(Footprint::fixed)
          .toList();
    }
  }
}
