package weighhouse.formula.normal;

import weighhouse.workbook.CellAddress;

/**
 * A formula in normal form.
 *
 * @param poly the sum of products
 * @param level how far it was taken apart
 * @param host the cell whose formula it is
 * @param origins which parts of the formula, and of the helper cells, became what
 */
public record NormalForm(Poly poly, Level level, CellAddress host, Origins origins) {}
