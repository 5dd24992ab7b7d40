package weighhouse.effect.survival;

import java.util.ArrayList;
import java.util.List;

/**
 * Kaplan-Meier survival, {@code product of (1 - d/n)}, with the Nelson-Aalen cumulative hazard,
 * {@code sum of d/n}.
 *
 * <p>Source: collett.
 */
public final class KaplanMeier {
  /** Survival this near to one half is on it: products of fractions seldom hit it exactly. */
  private static final double ON_HALF = 1e-12;

  private final List<SurvivalStep> steps;

  private KaplanMeier(List<SurvivalStep> steps) {
    this.steps = List.copyOf(steps);
  }

  public static KaplanMeier of(SurvivalTimes people) {
    List<SurvivalStep> steps = new ArrayList<>();
    int[] order = people.longestFirst();
    double survival = 1;
    double hazard = 0;
    int last = order.length - 1;
    while (last >= 0) {
      double time = people.time(order[last]);
      int atRisk = last + 1;
      int events = 0;
      for (; last >= 0 && people.time(order[last]) == time; last--) {
        events += people.event(order[last]) ? 1 : 0;
      }
      if (events > 0) {
        survival *= (double) (atRisk - events) / atRisk;
        hazard += (double) events / atRisk;
        steps.add(new SurvivalStep(time, atRisk, events, survival, hazard));
      }
    }
    return new KaplanMeier(steps);
  }

  /** The steps by time, one for each distinct time with events. */
  public List<SurvivalStep> steps() {
    return steps;
  }

  /** Survival at a time, events at that time counted. */
  public double survival(double time) {
    int step = lastStep(time, true);
    return step < 0 ? 1 : steps.get(step).survival();
  }

  /** Survival just before a time. */
  public double survivalBefore(double time) {
    int step = lastStep(time, false);
    return step < 0 ? 1 : steps.get(step).survival();
  }

  /** Nelson-Aalen cumulative hazard at a time, events at that time counted. */
  public double cumulativeHazard(double time) {
    int step = lastStep(time, true);
    return step < 0 ? 0 : steps.get(step).cumulativeHazard();
  }

  /** Events up to a time, that time counted. */
  public int eventsUntil(double time) {
    return steps.stream().filter(s -> s.time() <= time).mapToInt(SurvivalStep::events).sum();
  }

  /**
   * Median: the first time at which survival is below one half; where it rests on one half, the
   * middle of that rest (as R's survival package has it).
   *
   * @return NaN where survival stays above one half
   */
  public double median() {
    for (int i = 0; i < steps.size(); i++) {
      SurvivalStep step = steps.get(i);
      if (Math.abs(step.survival() - 0.5) < ON_HALF && i + 1 < steps.size()) {
        return (step.time() + steps.get(i + 1).time()) / 2;
      }
      if (step.survival() < 0.5 + ON_HALF) {
        return step.time();
      }
    }
    return Double.NaN;
  }

  private int lastStep(double time, boolean including) {
    int low = 0;
    int high = steps.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      double at = steps.get(middle).time();
      if (at < time || (including && at == time)) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low - 1;
  }
}
