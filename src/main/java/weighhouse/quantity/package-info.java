/**
 * What numbers mean: kinds, spans, roles, and the evidence for them. The words are data ({@code
 * vocabulary}), texts near a cell are found in {@code label}, formulas speak in {@code algebra},
 * and {@code inference} weighs all of it. No rule lives here; rules see only {@link
 * weighhouse.quantity.Quantities}, from expression to quantity.
 */
package weighhouse.quantity;
