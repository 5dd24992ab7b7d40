/**
 * Reads Office Open XML workbooks (.xlsx, .xlsm; ECMA-376 transitional and strict) into the
 * snapshot: a zip archive in memory, its content types and relationships, and one streaming parser
 * for each kind of part.
 *
 * <p>May live here: knowledge of the parts and their elements. May not: the meaning of formulas,
 * other file formats, POI's user model. Start at {@link weighhouse.workbook.ooxml.OoxmlReader};
 * sheets are in {@code SheetPart}, their cells in {@code CellsParser}.
 */
package weighhouse.workbook.ooxml;
