/**
 * The copy for the author: the workbook's own file with corrected formulas, comments that tell the
 * old formula and the reason, and a sheet that lists the findings. {@link
 * weighhouse.report.copy.CorrectedCopy} is the way in; {@code ooxml} changes the few parts of an
 * .xlsx or .xlsm that must change and passes on all others byte for byte, {@code biff} does .xls.
 * Decides nothing about what is right: formulas, values and reasons come from the audit.
 */
package weighhouse.report.copy;
