/**
 * The algebra of formulas: a tree becomes a sum of products over atoms, so that formulas that
 * differ only in how they are written become equal. {@link weighhouse.formula.normal.Normaliser}
 * goes from trees to {@link weighhouse.formula.normal.Poly}, {@link
 * weighhouse.formula.normal.Rebuilder} back.
 *
 * <p>Knows where cells are but not what their numbers mean: which helper cells to look through and
 * which functions to see past is decided by the caller. Powers and logarithms are treated as for
 * positive numbers, which rates, probabilities and ratios are.
 */
package weighhouse.formula.normal;
