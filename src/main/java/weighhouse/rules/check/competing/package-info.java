/**
 * Checks of states that are left in several ways: exits and what remains, rows of matrices, traces
 * that have to keep the cohort together, and background mortality. What a row or a trace is, is
 * told by {@link weighhouse.rules.check.competing.Remainder}, {@link
 * weighhouse.rules.check.competing.Matrices} and {@link weighhouse.rules.check.competing.Traces};
 * the checks only ask for their sums.
 */
package weighhouse.rules.check.competing;
