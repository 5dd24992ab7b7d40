/**
 * What a corrected copy changes, before any file format: formulas, comments and values by cell.
 * Knows findings; knows no file.
 */
package weighhouse.report.copy.edit;
