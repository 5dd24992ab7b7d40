/**
 * The list of formats: what users call them, how their files are named, who writes them. A new
 * format is a {@link weighhouse.report.ReportWriter} in a package of its own and a line here.
 */
package weighhouse.report.format;
