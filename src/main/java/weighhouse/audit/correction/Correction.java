package weighhouse.audit.correction;

import java.util.List;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * A formula put in place of the one that stands in some ranges.
 *
 * @param cells ranges of the one formula
 * @param host the cell that the trees are written for
 * @param original the formula's tree now
 * @param offending the node that is replaced, by identity a node of {@code original}, or null for
 *     all
 * @param corrected the whole corrected tree, relative to the host
 */
public record Correction(
    List<CellRange> cells, CellAddress host, Expr original, Expr offending, Expr corrected) {}
