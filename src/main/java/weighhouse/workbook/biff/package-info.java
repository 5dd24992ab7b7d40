/**
 * Reads binary workbooks (.xls of Excel 97 to 2003, BIFF8) into the snapshot, by POI.
 *
 * <p>May live here: what POI's model gives, and the records that it does not show. May not: other
 * formats, the meaning of formulas. Start at {@link weighhouse.workbook.biff.BiffReader}.
 */
package weighhouse.workbook.biff;
