/**
 * The texts near a number and what they make of it. {@link weighhouse.quantity.label.Headings}
 * finds them (beside, above, section title, defined name, comment), {@link
 * weighhouse.quantity.label.Labels} weighs what the vocabulary reads in them into one {@link
 * weighhouse.quantity.label.Guess}.
 *
 * <p>Looks at texts and at where numbers stand, never into formulas: what formulas say is {@code
 * quantity.algebra}'s, and which of the two is believed is {@code quantity.inference}'s.
 */
package weighhouse.quantity.label;
