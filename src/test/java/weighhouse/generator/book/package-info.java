/**
 * Workbooks as the generator drafts them: a sheet is a map of cells, formulas are templates whose
 * <code>{symbol}</code> is replaced by a reference to the cell that registered it. Writing through
 * POI and recalculation by LibreOffice live here too; what stands in a model does not (see {@code
 * model}, {@code fault} and {@code layout}).
 */
package weighhouse.generator.book;
