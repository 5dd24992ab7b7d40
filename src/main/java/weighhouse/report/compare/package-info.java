/**
 * Two audits side by side: what was resolved, what is new, what stayed, and how measures, inputs
 * and outcomes moved. Matches by id and by label, never by address, since rows move between
 * versions.
 */
package weighhouse.report.compare;
