package weighhouse.formula;

import weighhouse.workbook.CellRange;

/**
 * Neighbouring cells of one shape that fill a rectangle.
 *
 * @param id position in {@link Shapes#regions()}
 * @param shape the shape's id
 * @param range the cells
 */
public record Region(int id, int shape, CellRange range) {}
