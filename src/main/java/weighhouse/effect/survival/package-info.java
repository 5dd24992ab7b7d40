/**
 * Times to event of individual people, and survival curves read off them: Kaplan-Meier, log-rank,
 * Cox regression, tests of proportional hazards, a Weibull fit. Start at {@link
 * weighhouse.effect.survival.SurvivalTimes} for people's data, at {@link
 * weighhouse.effect.survival.CurvePair} for two columns of survival.
 *
 * <p>One stratum, right censoring, weights of 1; fixed covariates. Lists of unequal length,
 * negative times and the like throw {@link IllegalArgumentException}. Times are in any one unit.
 */
package weighhouse.effect.survival;
