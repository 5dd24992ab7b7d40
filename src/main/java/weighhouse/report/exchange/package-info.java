/**
 * The findings in formats that pipelines know: SARIF 2.1.0, JUnit's XML and CSV. They tell less
 * than the JSON report; each says what its readers expect and no more.
 */
package weighhouse.report.exchange;
