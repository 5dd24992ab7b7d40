/**
 * Words and numbers as reports print them: text of a workbook made harmless, numbers in as many
 * digits as a reader needs. Knows no output format; escaping for a format is the format's own task.
 */
package weighhouse.report.text;
