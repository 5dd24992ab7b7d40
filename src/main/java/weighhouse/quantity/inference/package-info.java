/**
 * Brings together what labels and formulas say of every number. {@link
 * weighhouse.quantity.inference.Inference} is the entry: cells are gathered into {@code Unit}s (one
 * number with its own label, or a run of cells of one formula and one label), labels give a first
 * guess, the algebra runs up and down between units until nothing changes, and the result is handed
 * out as {@link weighhouse.quantity.Quantities}.
 *
 * <p>What words mean is in {@code quantity.vocabulary}, which texts count in {@code
 * quantity.label}, what arithmetic does to kinds in {@code quantity.algebra}; here is only who is
 * believed. Rules that judge a model start from the result, in {@code weighhouse.rules}.
 */
package weighhouse.quantity.inference;
