/**
 * What an audit works with and what it finds: options and brief on the one side, the {@link
 * weighhouse.audit.AuditResult} with its findings, ledger and coverage on the other. Plain records
 * that reports are written from; no reading, matching or calculating here. The audit itself is
 * {@link weighhouse.audit.pipeline.Auditor}, next to {@code audit.probe}, which moves the measures
 * of the running model, and {@code audit.correction}, which puts corrected formulas into it.
 */
package weighhouse.audit;
