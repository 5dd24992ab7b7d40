/**
 * Rules put to the test by their own examples: an example becomes a small workbook in memory, goes
 * through the same reading as any other, and what the rule finds is held against what its file
 * says.
 */
package weighhouse.rules.trial;
