package weighhouse.effect.survival;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import weighhouse.effect.Probability;
import weighhouse.effect.Scale;

/**
 * Survival of two arms at the same times, and what their cumulative hazards say of proportional
 * hazards. Under a constant hazard ratio the curves of {@code ln(-ln S)} against {@code ln t} run
 * parallel, their distance being the log hazard ratio.
 *
 * <p>Source: latimer-2013 (log-cumulative-hazard plots).
 */
public final class CurvePair {
  private final List<Point> points;

  /**
   * One time.
   *
   * @param control survival of the control arm
   * @param treated survival of the treated arm
   * @param weight how much the distance of the arms is known by here: 1 over the variance of the
   *     log of {@code H1/H0}, near enough {@code 1 / (1/d0 + 1/d1)} with d events so far; 1 for
   *     curves given as numbers
   */
  public record Point(double time, double control, double treated, double weight) {

    /** {@code ln(H1 / H0)}: distance of the log cumulative hazards; NaN where either H is 0. */
    public double logRatio() {
      double ratio = Scale.HAZARD.ratio(1 - treated, 1 - control);
      return ratio > 0 && ratio < Double.POSITIVE_INFINITY ? Math.log(ratio) : Double.NaN;
    }
  }

  /** The hazard ratio between two neighbouring times; NaN where it has no value. */
  public record Implied(double from, double to, double hazardRatio) {}

  private CurvePair(List<Point> points) {
    this.points = List.copyOf(points);
  }

  /**
   * Two columns of survival.
   *
   * @param times ascending
   * @param control survival of the control arm at those times, in [0, 1]
   * @param treated likewise of the treated arm
   */
  public static CurvePair of(double[] times, double[] control, double[] treated) {
    if (control.length != times.length || treated.length != times.length) {
      throw new IllegalArgumentException("Both arms need survival at each of the times");
    }
    return new CurvePair(
        IntStream.range(0, times.length)
            .mapToObj(i -> new Point(times[i], control[i], treated[i], 1))
            .toList());
  }

  /** Two estimated curves at all times at which either steps, up to the end of the shorter. */
  public static CurvePair of(KaplanMeier control, KaplanMeier treated) {
    double end = Math.min(lastTime(control), lastTime(treated));
    List<Point> points = new ArrayList<>();
    Stream.of(control, treated)
        .flatMap(curve -> curve.steps().stream())
        .mapToDouble(SurvivalStep::time)
        .filter(time -> time <= end)
        .sorted()
        .distinct()
        .forEach(time -> points.add(point(time, control, treated)));
    return new CurvePair(points);
  }

  private static Point point(double time, KaplanMeier control, KaplanMeier treated) {
    double weight = 1 / (1.0 / control.eventsUntil(time) + 1.0 / treated.eventsUntil(time));
    return new Point(time, control.survival(time), treated.survival(time), weight);
  }

  private static double lastTime(KaplanMeier curve) {
    List<SurvivalStep> steps = curve.steps();
    return steps.isEmpty() ? 0 : steps.get(steps.size() - 1).time();
  }

  public List<Point> points() {
    return points;
  }

  /** The hazard ratio from each time to the next: {@code ln(S1'/S1) / ln(S0'/S0)}. */
  public List<Implied> implied() {
    List<Implied> implied = new ArrayList<>();
    for (int i = 1; i < points.size(); i++) {
      Point a = points.get(i - 1);
      Point b = points.get(i);
      double p0 = Probability.ofSurvival(a.control(), b.control());
      double p1 = Probability.ofSurvival(a.treated(), b.treated());
      implied.add(new Implied(a.time(), b.time(), Scale.HAZARD.ratio(p1, p0)));
    }
    return implied;
  }

  /**
   * Slope of {@code ln(H1/H0)} on {@code ln t}, weighted: 0 where the log cumulative hazards are
   * parallel; for two Weibull curves the difference of their shapes. A description, no test: the
   * points of one curve are not independent. NaN with fewer than two usable times.
   */
  public double slope() {
    List<Point> usable =
        points.stream().filter(p -> p.time() > 0 && !Double.isNaN(p.logRatio())).toList();
    double weights = usable.stream().mapToDouble(Point::weight).sum();
    double meanTime = mean(usable, weights, p -> Math.log(p.time()));
    double meanRatio = mean(usable, weights, Point::logRatio);
    double products = 0;
    double squares = 0;
    for (Point point : usable) {
      double time = Math.log(point.time()) - meanTime;
      products += point.weight() * time * (point.logRatio() - meanRatio);
      squares += point.weight() * time * time;
    }
    return products / squares;
  }

  private static double mean(List<Point> points, double weights, ToDoubleFunction<Point> function) {
    return points.stream().mapToDouble(p -> p.weight() * function.applyAsDouble(p)).sum() / weights;
  }

  /**
   * The times at which the arms have changed places, each the first at which the other one is
   * ahead; differences of at most {@code tolerance} count as none.
   */
  public List<Double> crossings(double tolerance) {
    List<Double> crossings = new ArrayList<>();
    double ahead = 0;
    for (Point point : points) {
      double difference = point.treated() - point.control();
      double now = Math.abs(difference) > tolerance ? Math.signum(difference) : 0;
      if (now * ahead < 0) {
        crossings.add(point.time());
      }
      ahead = now == 0 ? ahead : now;
    }
    return crossings;
  }
}
