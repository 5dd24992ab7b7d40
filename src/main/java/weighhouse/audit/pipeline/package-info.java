/**
 * The audit from bytes to result: reads, recalculates, infers, matches, probes, corrects, and
 * weighs what each finding does. Holds the order of these steps and the making of findings; no rule
 * and no arithmetic of the field lives here (see {@code weighhouse.rules} and {@code
 * weighhouse.effect}).
 */
package weighhouse.audit.pipeline;
