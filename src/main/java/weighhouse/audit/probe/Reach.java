package weighhouse.audit.probe;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.quantity.Kind;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Which cells of the risk kinds a measure reaches, and where it enters them first. */
final class Reach {
  /** Cells of one region that are looked at; a fault that a region has, it has all along. */
  static final int SAMPLE = 5;

  private final Subject subject;
  private final List<CellRange> dependents;

  Reach(Subject subject, CellAddress measure) {
    this.subject = subject;
    this.dependents = subject.recalculation().dependents(Set.of(measure));
  }

  /** The regions that depend on the measure and hold a kind that passes, in the sheet's order. */
  List<Region> regions(Predicate<Kind> kinds) {
    List<Region> reached = new ArrayList<>();
    for (Region region : subject.shapes().regions()) {
      if (kinds.test(subject.quantities().at(region.range().first()).kind())
          && !givesRatio(region)
          && dependsOnMeasure(region.range())) {
        reached.add(region);
      }
    }
    return reached;
  }

  /** Whether its formula only passes a ratio on, whatever its label makes of it. */
  private boolean givesRatio(Region region) {
    Shape shape = subject.shapes().all().get(region.shape());
    Kind kind = subject.quantities().of(shape.tree(), region.range().first()).kind();
    return RatioLaw.of(kind).isPresent();
  }

  private boolean dependsOnMeasure(CellRange range) {
    return dependents.stream().anyMatch(d -> overlap(d, range));
  }

  /**
   * Those of the regions whose formulas read no cell of another of them: where the measure enters.
   */
  List<Region> entries(List<Region> regions) {
    List<Region> entries = new ArrayList<>();
    for (Region region : regions) {
      List<CellRange> read = subject.recalculation().precedents(region.range().first());
      boolean copies =
          regions.stream()
              .filter(other -> other.id() != region.id())
              .anyMatch(other -> read.stream().anyMatch(r -> overlap(r, other.range())));
      if (!copies) {
        entries.add(region);
      }
    }
    return entries;
  }

  static boolean overlap(CellRange a, CellRange b) {
    return a.sheet() == b.sheet()
        && a.firstRow() <= b.lastRow()
        && b.firstRow() <= a.lastRow()
        && a.firstColumn() <= b.lastColumn()
        && b.firstColumn() <= a.lastColumn();
  }
}
