package weighhouse.recalculate.engine;

import weighhouse.recalculate.Value;
import weighhouse.workbook.CellStore;

/** Stored cells as values. */
final class StoredValues {
  private StoredValues() {}

  static Value at(CellStore cells, int index) {
    return switch (cells.kind(index)) {
      case NUMBER -> new Value.Num(cells.number(index));
      case TEXT -> new Value.Text(cells.text(index));
      case BOOLEAN -> new Value.Logical(cells.number(index) != 0);
      case ERROR -> new Value.Fault(cells.text(index));
      case BLANK -> new Value.Blank();
    };
  }
}
