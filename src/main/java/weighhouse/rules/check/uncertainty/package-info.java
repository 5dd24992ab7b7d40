/**
 * Checks of how the uncertainty of a ratio is written down and drawn: on which scale, with which
 * standard error, from which distribution, over which range, and whether the draw reaches anything.
 * One check a file, listed as a service; their texts and examples are in {@code rules/uncertainty}.
 */
package weighhouse.rules.check.uncertainty;
