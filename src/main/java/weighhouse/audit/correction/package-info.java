/**
 * Corrected formulas and how several of them become one change of the model, two of one formula
 * included. Knows trees; knows neither rules nor values. {@code audit.pipeline} runs the change.
 */
package weighhouse.audit.correction;
