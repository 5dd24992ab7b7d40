package weighhouse.formula.normal;

import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;

/**
 * A part of a formula with the cell it is relative to.
 *
 * @param node the very node of the cell's tree
 * @param host the cell
 */
public record Hosted(Expr node, CellAddress host) {}
