package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.Reference;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Sheet;

/** {@code A1#}: the range that the formula in A1 was stored with. */
final class SpillNode extends ReferenceNode {
  private final Node anchor;

  SpillNode(Node anchor, boolean array) {
    super(array);
    this.anchor = anchor;
  }

  @Override
  public Reference reference(Frame frame) {
    Reference at = anchor.reference(frame);
    if (at == null) {
      throw Fault.REF.exception();
    }
    CellRange cell = at.area();
    Sheet sheet = frame.surroundings.workbook().sheet(cell.sheet());
    for (CellRange range : sheet.arrays()) {
      if (range.first().equals(cell.first())) {
        return Reference.of(range);
      }
    }
    throw Fault.REF.exception();
  }

  @Override
  Value otherwise(Frame frame) {
    return Fault.REF.value();
  }
}
