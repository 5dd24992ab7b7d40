package weighhouse.recalculate.engine;

import java.util.List;
import java.util.Map;
import weighhouse.formula.Shapes;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.cells.Layout;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Names;
import weighhouse.workbook.Workbook;

/**
 * A compiled workbook.
 *
 * @param units all that can be run
 * @param stored the stored values
 * @param refused formula cells that cannot be run, counted by reason
 */
record Model(
    Workbook workbook,
    Shapes shapes,
    Names names,
    Layout layout,
    List<Unit> units,
    CellState stored,
    Map<String, Integer> refused) {

  static Model of(Workbook workbook, Shapes shapes) {
    return new ModelBuilder(workbook, shapes).build();
  }
}
