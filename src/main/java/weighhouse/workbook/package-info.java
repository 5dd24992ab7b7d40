/**
 * The snapshot of a workbook that everything else works on: sheets with compact cell stores,
 * defined names, tables, comments, and the words of Excel's A1 notation.
 *
 * <p>May live here: immutable types that say what a workbook holds, and {@link
 * weighhouse.workbook.CellsBuilder}, which fills a cell store. May not: knowledge of a file format,
 * and anything that reads a meaning into a cell. Files are read in {@link
 * weighhouse.workbook.file}, the way in, and its helpers {@code ooxml} (.xlsx, .xlsm) and {@code
 * biff} (.xls). Next in the order of data: {@code weighhouse.formula}.
 */
package weighhouse.workbook;
