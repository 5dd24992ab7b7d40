/**
 * Checks of survival along time: curves that rise or cross, and effects on curves that have no
 * proportional hazards. What a parameter of one formula says is left to the patterns of the rule
 * files.
 */
package weighhouse.rules.check.curves;
