/**
 * Calculation of a workbook's formulas: what a calculation answers with ({@link
 * weighhouse.recalculate.Value}, {@link weighhouse.recalculate.Values}), what may be replaced in it
 * ({@link weighhouse.recalculate.Change}) and how it compares with the stored values ({@link
 * weighhouse.recalculate.Replay}). Only the types that callers see live here. The worksheet
 * functions are in {@code functions}, the cells' values in {@code cells}, compiled formulas in
 * {@code program}, the order of calculation in {@code order}, and {@code engine} puts them
 * together: start at {@link weighhouse.recalculate.Recalculation}. Nothing here knows a rule or an
 * effect measure.
 */
package weighhouse.recalculate;
