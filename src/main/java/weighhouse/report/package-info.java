/**
 * Writes one {@link weighhouse.audit.AuditResult} for people and for programs. Here: what writers
 * have in common. May not live in this package or below: anything that finds, calculates or judges;
 * a writer only shows what the result holds. Next: {@code report.format} lists the formats, {@code
 * report.html} is for people, {@code report.json} for programs, {@code report.exchange} for
 * pipelines, {@code report.copy} makes the author's corrected workbook, {@code report.compare} sets
 * two audits side by side; {@code report.text}, {@code report.plot} and {@code report.file} serve
 * them.
 */
package weighhouse.report;
