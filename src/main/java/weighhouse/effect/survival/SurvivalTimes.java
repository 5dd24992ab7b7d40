package weighhouse.effect.survival;

import java.util.Arrays;
import java.util.Comparator;
import java.util.stream.IntStream;
import weighhouse.effect.estimate.PersonTime;

/** Right-censored times of individual people. Immutable. */
public final class SurvivalTimes {
  private final double[] times;
  private final boolean[] events;

  private SurvivalTimes(double[] times, boolean[] events) {
    this.times = times;
    this.events = events;
  }

  /**
   * People's times.
   *
   * @param times at least 0 and finite
   * @param events whether the time ended in an event; otherwise it is censored
   */
  public static SurvivalTimes of(double[] times, boolean[] events) {
    if (times.length != events.length) {
      throw new IllegalArgumentException(
          times.length + " times need as many events, not " + events.length);
    }
    for (double time : times) {
      if (!(time >= 0) || Double.isInfinite(time)) {
        throw new IllegalArgumentException("A time must be at least 0 and finite, not " + time);
      }
    }
    return new SurvivalTimes(times.clone(), events.clone());
  }

  /** These people and others together, these first. */
  public SurvivalTimes with(SurvivalTimes others) {
    double[] allTimes = Arrays.copyOf(times, size() + others.size());
    boolean[] allEvents = Arrays.copyOf(events, size() + others.size());
    System.arraycopy(others.times, 0, allTimes, size(), others.size());
    System.arraycopy(others.events, 0, allEvents, size(), others.size());
    return new SurvivalTimes(allTimes, allEvents);
  }

  public int size() {
    return times.length;
  }

  public double time(int person) {
    return times[person];
  }

  public boolean event(int person) {
    return events[person];
  }

  /** Number of events. */
  public int events() {
    return (int) IntStream.range(0, size()).filter(this::event).count();
  }

  /** Total time at risk. */
  public double personTime() {
    return Arrays.stream(times).sum();
  }

  /** Events and person-time of these people against a control arm. */
  public PersonTime against(SurvivalTimes control) {
    return new PersonTime(events(), personTime(), control.events(), control.personTime());
  }

  /** People's numbers from the longest time to the shortest. */
  int[] longestFirst() {
    return IntStream.range(0, size())
        .boxed()
        .sorted(Comparator.comparingDouble((Integer person) -> times[person]).reversed())
        .mapToInt(Integer::intValue)
        .toArray();
  }

  /** The distinct times at which someone had the event, ascending. */
  double[] eventTimes() {
    return IntStream.range(0, size())
        .filter(this::event)
        .mapToDouble(this::time)
        .sorted()
        .distinct()
        .toArray();
  }

  /** People whose time is at least so long. */
  int atRisk(double time) {
    return (int) Arrays.stream(times).filter(t -> t >= time).count();
  }

  /** People with the event at exactly that time. */
  int eventsAt(double time) {
    return (int) IntStream.range(0, size()).filter(i -> events[i] && times[i] == time).count();
  }
}
