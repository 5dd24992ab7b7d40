package weighhouse.effect.survival;

import weighhouse.effect.estimate.ObservedExpected;

/**
 * Log-rank comparison of two arms.
 *
 * <p>Source: collett; tierney-2007 for the ratio it gives.
 *
 * @param expectedControl events expected in the control arm if the arms did not differ
 * @param treated observed less expected events of the treated arm and the variance
 */
public record LogRank(double expectedControl, ObservedExpected treated) {

  /** Compares two arms; an arm without people throws IllegalArgumentException. */
  public static LogRank of(SurvivalTimes control, SurvivalTimes treated) {
    if (control.size() == 0 || treated.size() == 0) {
      throw new IllegalArgumentException("Both arms need people");
    }
    double expectedControl = 0;
    double expectedTreated = 0;
    double variance = 0;
    for (double time : control.with(treated).eventTimes()) {
      double n0 = control.atRisk(time);
      double n1 = treated.atRisk(time);
      double n = n0 + n1;
      double events = control.eventsAt(time) + treated.eventsAt(time);
      expectedControl += events * n0 / n;
      expectedTreated += events * n1 / n;
      if (n > 1) {
        variance += events * (n - events) * n0 * n1 / (n * n * (n - 1));
      }
    }
    double difference = treated.events() - expectedTreated;
    return new LogRank(expectedControl, new ObservedExpected(difference, variance));
  }

  /** Chi-square statistic with one degree of freedom. */
  public double chiSquare() {
    return treated.chiSquare();
  }
}
