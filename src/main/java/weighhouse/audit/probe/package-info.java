/**
 * Moves every effect measure of the running model and reads from the answers on which scale it
 * acts. Knows quantities and what-ifs; knows no rule's pattern. Findings are made of its
 * observations in {@code audit.pipeline}.
 */
package weighhouse.audit.probe;
