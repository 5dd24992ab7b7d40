package weighhouse.recalculate.program;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.Reference;
import weighhouse.workbook.CellRange;

/** Union, intersection, or the range between two references. */
final class JoinedReference extends ReferenceNode {
  private final BinaryOp op;
  private final Node left;
  private final Node right;

  JoinedReference(BinaryOp op, Node left, Node right, boolean array) {
    super(array);
    this.op = op;
    this.left = left;
    this.right = right;
  }

  @Override
  public Reference reference(Frame frame) {
    Reference a = reference(left, frame);
    Reference b = reference(right, frame);
    if (op == BinaryOp.UNION) {
      List<CellRange> areas = new ArrayList<>(a.areas());
      areas.addAll(b.areas());
      return new Reference(areas);
    }
    CellRange x = a.area();
    CellRange y = b.area();
    if (x.sheet() != y.sheet()) {
      throw Fault.VALUE.exception();
    }
    return Reference.of(op == BinaryOp.RANGE ? span(x, y) : common(x, y));
  }

  private static Reference reference(Node node, Frame frame) {
    Reference reference = node.reference(frame);
    if (reference == null) {
      throw Fault.VALUE.exception();
    }
    return reference;
  }

  private static CellRange span(CellRange a, CellRange b) {
    return new CellRange(
        a.sheet(),
        Math.min(a.firstRow(), b.firstRow()),
        Math.min(a.firstColumn(), b.firstColumn()),
        Math.max(a.lastRow(), b.lastRow()),
        Math.max(a.lastColumn(), b.lastColumn()));
  }

  private static CellRange common(CellRange a, CellRange b) {
    int top = Math.max(a.firstRow(), b.firstRow());
    int left = Math.max(a.firstColumn(), b.firstColumn());
    int bottom = Math.min(a.lastRow(), b.lastRow());
    int right = Math.min(a.lastColumn(), b.lastColumn());
    if (top > bottom || left > right) {
      throw Fault.NULL.exception();
    }
    return new CellRange(a.sheet(), top, left, bottom, right);
  }

  @Override
  Value otherwise(Frame frame) {
    return Fault.VALUE.value();
  }
}
