/**
 * Small drawings as inline SVG with real text: lines along an axis and the beam that weighs an
 * entered ratio against the effective one. Drawn straight into the page's tree, so that every text
 * is escaped as all others are; colours come from the page's style sheet by class. Knows plots'
 * data, not the audit around them. Why no charting library: docs/decisions/.
 */
package weighhouse.report.plot;
