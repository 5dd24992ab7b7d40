/**
 * What formulas say of quantities. Up: {@link weighhouse.quantity.algebra.Algebra} tells what a
 * formula gives when one knows what its operands are ({@code rate * time} is a cumulative hazard).
 * Down: {@link weighhouse.quantity.algebra.Demands} tells what operands must be for the formula to
 * make sense (x in {@code 1-EXP(-x*t)} is a rate).
 *
 * <p>Works on one formula at a time, with the operands' quantities handed in as {@link
 * weighhouse.quantity.algebra.Operands}. Which cells they come from, and what happens where labels
 * say otherwise, is {@code quantity.inference}'s.
 */
package weighhouse.quantity.algebra;
