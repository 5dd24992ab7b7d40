/**
 * Formulas as text, as trees and as shapes. {@link weighhouse.formula.FormulaParser} and {@link
 * weighhouse.formula.FormulaPrinter} go between text and {@link weighhouse.formula.Expr}; {@link
 * weighhouse.formula.Shapes} holds every formula of a workbook once per relative form.
 *
 * <p>Knows Excel's notation and where cells are, but neither what a function computes nor what a
 * number means: those are {@code recalculate} and {@code quantity}. The algebra of formulas is in
 * {@code weighhouse.formula.normal}.
 */
package weighhouse.formula;
