package weighhouse.recalculate;

import java.util.List;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * A workbook compiled for calculation. Safe for use by several threads at once: a what-if never
 * changes the state it starts from.
 */
public interface Recalculation {
  /** All formulas run on the workbook as it is; trusted cells only, others keep stored values. */
  Values base();

  /** The workbook with some cells replaced; runs only what depends on them. */
  Values whatIf(Change change);

  /**
   * The workbook with some cells replaced and all random numbers drawn anew. A cell draws the same
   * numbers for one seed whatever the change, so that two changes compare under common draws.
   */
  Values draw(long seed, Change change);

  /** Evaluates one expression as if it stood in the host cell. */
  Value evaluate(Expr expression, CellAddress host, Values values);

  /** Formula cells that read the given cells, directly or through others. */
  List<CellRange> dependents(Set<CellAddress> cells);

  /** Cells that the formula in the cell reads directly, as ranges. */
  List<CellRange> precedents(CellAddress cell);

  /** How the recalculated values compare with the stored ones. */
  Replay replay();
}
