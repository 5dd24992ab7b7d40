package weighhouse.recalculate;

import java.util.List;
import java.util.Map;
import weighhouse.workbook.CellAddress;

/**
 * The workbook recalculated as it is, against its stored values.
 *
 * @param formulaCells all formula cells
 * @param recalculated those that the engine could run
 * @param reproduced those whose result equals the stored value (or that had no stored value)
 * @param differing cells that differ, first of each shape first
 * @param unsupported cells not run, counted by reason (a function's name, "circular reference"...)
 */
public record Replay(
    int formulaCells,
    int recalculated,
    int reproduced,
    List<Difference> differing,
    Map<String, Integer> unsupported) {

  /** A cell whose recalculated value differs from the stored one. */
  public record Difference(CellAddress cell, Value stored, Value recalculated) {}
}
