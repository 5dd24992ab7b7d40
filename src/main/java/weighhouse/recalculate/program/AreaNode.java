package weighhouse.recalculate.program;

import java.util.ArrayList;
import java.util.List;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Reference;
import weighhouse.workbook.CellRange;

/** A reference to a rectangle, or to the same rectangle of several sheets. */
final class AreaNode extends ReferenceNode {
  private final List<Footprint> footprints;

  AreaNode(List<Footprint> footprints, boolean array) {
    super(array);
    this.footprints = footprints;
  }

  @Override
  public Reference reference(Frame frame) {
    if (footprints.size() == 1) {
      return Reference.of(footprints.get(0).at(frame.row(), frame.column()));
    }
    List<CellRange> areas = new ArrayList<>();
    for (Footprint footprint : footprints) {
      areas.add(footprint.at(frame.row(), frame.column()));
    }
    return new Reference(areas);
  }

  @Override
  Value otherwise(Frame frame) {
    throw new IllegalStateException("always a reference");
  }
}
