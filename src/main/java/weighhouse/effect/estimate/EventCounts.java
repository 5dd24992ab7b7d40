package weighhouse.effect.estimate;

/**
 * Events and non-events of two arms. No continuity correction is made: a zero cell gives an
 * infinite or undefined logarithm.
 *
 * <p>Sources: bland-altman-2000, colditz-1994 (use).
 *
 * @param events1 events with the treatment
 * @param others1 people without event there
 * @param events0 events in the control arm
 * @param others0 people without event there
 */
public record EventCounts(double events1, double others1, double events0, double others0) {

  /** Log risk ratio with variance {@code 1/a - 1/n1 + 1/c - 1/n0}. */
  public RatioEstimate riskRatio() {
    double total1 = events1 + others1;
    double total0 = events0 + others0;
    double variance = 1 / events1 - 1 / total1 + 1 / events0 - 1 / total0;
    double ratio = (events1 / total1) / (events0 / total0);
    return new RatioEstimate(Math.log(ratio), Math.sqrt(variance));
  }

  /** Log odds ratio with variance {@code 1/a + 1/b + 1/c + 1/d}. */
  public RatioEstimate oddsRatio() {
    double variance = 1 / events1 + 1 / others1 + 1 / events0 + 1 / others0;
    double ratio = (events1 * others0) / (others1 * events0);
    return new RatioEstimate(Math.log(ratio), Math.sqrt(variance));
  }

  /** Observed less expected events of the treatment, hypergeometric variance. */
  public ObservedExpected observedExpected() {
    double total1 = events1 + others1;
    double total0 = events0 + others0;
    double total = total1 + total0;
    double events = events1 + events0;
    double variance = events * (total - events) * total1 * total0 / (total * total * (total - 1));
    return new ObservedExpected(events1 - events * total1 / total, variance);
  }
}
