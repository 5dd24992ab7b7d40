/**
 * The rules: loading the rule files, finding their patterns in the regions of a workbook, and the
 * few checks that no pattern can say. Sees the workbook through {@link weighhouse.rules.Subject}
 * only; knows nothing of probes, severities by consequence, or reports. Patterns are at work in
 * {@code weighhouse.rules.pattern}, files are read in {@code weighhouse.rules.file}. Matches go on
 * to {@code weighhouse.audit}.
 */
package weighhouse.rules;
