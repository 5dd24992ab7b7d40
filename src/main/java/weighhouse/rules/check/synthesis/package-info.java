/**
 * Checks of ratios made from other ratios: compared through a common comparator, pooled, turned
 * round. One check a file, listed as a service; their texts and examples are in {@code
 * rules/synthesis}.
 */
package weighhouse.rules.check.synthesis;
