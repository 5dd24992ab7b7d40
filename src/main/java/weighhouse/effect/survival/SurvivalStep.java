package weighhouse.effect.survival;

/**
 * One step of an estimated curve.
 *
 * @param time of the events
 * @param atRisk people at risk just before
 * @param events at that time
 * @param survival Kaplan-Meier estimate from here to the next step
 * @param cumulativeHazard Nelson-Aalen estimate likewise
 */
public record SurvivalStep(
    double time, int atRisk, int events, double survival, double cumulativeHazard) {}
