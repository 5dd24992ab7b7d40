package weighhouse.formula;

import weighhouse.workbook.CellAddress;

/**
 * A formula in relative form, shared by all the cells it was filled into.
 *
 * @param id position in {@link Shapes#all()}
 * @param formula text and tree as written in {@code host}
 * @param host the first cell of this shape
 * @param array whether it was entered as an array formula (or is dynamic), so that operators work
 *     on whole arrays instead of intersecting
 */
public record Shape(int id, ParsedFormula formula, CellAddress host, boolean array) {
  public Expr tree() {
    return formula.tree();
  }
}
