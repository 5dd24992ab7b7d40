package weighhouse.effect.estimate;

/**
 * Events and time at risk of two arms.
 *
 * @param events1 events with the treatment
 * @param time1 person-time there, above 0
 * @param events0 events in the control arm
 * @param time0 person-time there, above 0
 */
public record PersonTime(double events1, double time1, double events0, double time0) {

  /** Log rate ratio with variance {@code 1/events1 + 1/events0}; infinite without events. */
  public RatioEstimate rateRatio() {
    double ratio = (events1 / time1) / (events0 / time0);
    return new RatioEstimate(Math.log(ratio), Math.sqrt(1 / events1 + 1 / events0));
  }
}
