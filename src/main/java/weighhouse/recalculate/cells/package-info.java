/**
 * The values of a workbook's cells in flat arrays: where each cell has its slot ({@link
 * weighhouse.recalculate.cells.Layout}), what the slots hold ({@link
 * weighhouse.recalculate.cells.CellState}) and rectangles of them as functions read them. No
 * formula is known here; they are compiled in {@code program}.
 */
package weighhouse.recalculate.cells;
