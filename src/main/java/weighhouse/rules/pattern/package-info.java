/**
 * Typed patterns and how they are found in a cell's formula: what a formula's parts are as algebra
 * and as quantities, which of them a metavariable can stand for, the smallest part that is the
 * pattern's function of them, and the formula with that part corrected. Knows neither rule files
 * nor findings. Continue at {@code weighhouse.rules.file} and {@code weighhouse.rules}.
 */
package weighhouse.rules.pattern;
