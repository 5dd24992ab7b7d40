/**
 * The words of models as data: {@code rules/vocabulary.yaml} is read into a {@link
 * weighhouse.quantity.vocabulary.Vocabulary}, which tells what a label, a heading or a defined name
 * says of a number ({@link weighhouse.quantity.vocabulary.Reading}).
 *
 * <p>Knows words only, neither cells nor formulas. Where the texts near a cell are and which of
 * them counts is {@code quantity.label}'s.
 */
package weighhouse.quantity.vocabulary;
