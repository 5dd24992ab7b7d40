/**
 * The way from a file to the snapshot: looks at the first bytes, refuses what is no workbook in one
 * sentence, and hands the rest to the reader of its format.
 *
 * <p>May live here: telling file formats apart, and what to say of files that cannot be read. May
 * not: reading of any format. Start at {@link weighhouse.workbook.file.WorkbookReader}; next come
 * {@code weighhouse.workbook.ooxml} and {@code weighhouse.workbook.biff}.
 */
package weighhouse.workbook.file;
