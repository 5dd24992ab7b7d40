package weighhouse.recalculate.program;

import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Fault;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Reference;
import weighhouse.workbook.CellRange;

/**
 * A part that may point at cells. Where a value is wanted, an area gives the cell in the host's own
 * row or column (implicit intersection), or all its values where the formula works on arrays.
 */
abstract class ReferenceNode extends Node {
  private final boolean array;

  ReferenceNode(boolean array) {
    this.array = array;
  }

  /** The value where it points at nothing. */
  abstract Value otherwise(Frame frame);

  @Override
  public final Value value(Frame frame) {
    try {
      Reference reference = reference(frame);
      if (reference == null) {
        return otherwise(frame);
      }
      return array ? values(reference, frame) : intersection(reference, frame);
    } catch (FaultException e) {
      return e.value();
    }
  }

  @Override
  public final Grid grid(Frame frame) {
    try {
      Reference reference = reference(frame);
      if (reference == null) {
        return Grid.of(otherwise(frame));
      }
      return frame.cells(array ? clipped(reference, frame) : reference);
    } catch (FaultException e) {
      return Grid.of(e.value());
    }
  }

  private static Value values(Reference reference, Frame frame) {
    Grid grid = frame.cells(clipped(reference, frame));
    return grid.size() == 1 ? grid.at(0, 0) : grid.toArray();
  }

  /** Whole columns end where the longest sheet does, so that those of all sheets are equal. */
  private static Reference clipped(Reference reference, Frame frame) {
    if (reference.areas().size() > 1) {
      return reference;
    }
    CellRange area = reference.area();
    if (area.rows() < Footprint.ROWS && area.columns() < Footprint.COLUMNS) {
      return reference;
    }
    int rows = 1;
    int columns = 1;
    for (int sheet = 0; sheet < frame.layout.sheets(); sheet++) {
      rows = Math.max(rows, frame.layout.rows(sheet));
      columns = Math.max(columns, frame.layout.columns(sheet));
    }
    int lastRow = area.rows() < Footprint.ROWS ? area.lastRow() : rows - 1;
    int lastColumn = area.columns() < Footprint.COLUMNS ? area.lastColumn() : columns - 1;
    return Reference.of(
        new CellRange(area.sheet(), area.firstRow(), area.firstColumn(), lastRow, lastColumn));
  }

  static Value intersection(Reference reference, Frame frame) {
    CellRange area = reference.area();
    int row = area.rows() == 1 ? area.firstRow() : frame.row();
    int column = area.columns() == 1 ? area.firstColumn() : frame.column();
    boolean meets =
        row >= area.firstRow()
            && row <= area.lastRow()
            && column >= area.firstColumn()
            && column <= area.lastColumn();
    if (!meets || (area.rows() > 1 && area.columns() > 1)) {
      return Fault.VALUE.value();
    }
    return frame
        .cells(Reference.of(new CellRange(area.sheet(), row, column, row, column)))
        .at(0, 0);
  }
}
