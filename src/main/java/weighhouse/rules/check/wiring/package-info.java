/**
 * Checks of whether an effect measure is connected: formulas that lack it where their siblings have
 * it, references that slide off it, numbers typed in its place, cells that nothing reads. Each is
 * one class and goes through regions, never through single cells of a large range.
 */
package weighhouse.rules.check.wiring;
