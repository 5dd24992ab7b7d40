/**
 * Checks of a constant ratio against what the workbook holds of the trial behind it: survival
 * curves of two arms, times of patients, the length of follow-up. Listed as services; their texts
 * and examples are in {@code rules/evidence}. The statistics themselves are in {@code
 * effect.survival}.
 */
package weighhouse.rules.check.evidence;
