/**
 * The audit as one JSON object, {@code weighhouse-audit/1}, as {@code
 * docs/schema/audit.schema.json} describes it. Streamed; fields may be added, none renamed. No
 * wording and no rounding here.
 */
package weighhouse.report.json;
