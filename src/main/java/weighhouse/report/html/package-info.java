/**
 * The report for people: one self-contained page without network access, readable without its
 * script, on paper, on a phone, by keyboard and by ear. One class a section, in the order in which
 * {@link weighhouse.report.html.HtmlReport} puts them. Every text goes through {@link
 * weighhouse.report.html.Tags}, which makes it visible and leaves the escaping to the tree.
 */
package weighhouse.report.html;
