package weighhouse.audit;

import java.util.List;
import java.util.Map;
import weighhouse.workbook.CellAddress;

/**
 * What was and was not read, recalculated, reproduced.
 *
 * @param formulaCells all formula cells
 * @param read those whose formula was parsed
 * @param recalculated those the engine could run
 * @param reproduced those whose result equals the stored value
 * @param notReproduced cells that differ, one or more a shape
 * @param unsupported reason or function to number of cells
 * @param macros parts that hold macros (named as not audited)
 * @param externalLinks targets
 * @param hidden hidden sheets, rows and columns in words
 * @param problems all else, one sentence each
 */
public record Coverage(
    int formulaCells,
    int read,
    int recalculated,
    int reproduced,
    List<Difference> notReproduced,
    Map<String, Integer> unsupported,
    List<String> macros,
    List<String> externalLinks,
    List<String> hidden,
    List<String> problems) {

  /** A cell whose recalculated value differs from the stored one. */
  public record Difference(CellAddress cell, Figure stored, Figure recalculated) {}
}
