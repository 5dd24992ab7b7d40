package weighhouse.effect.curve;

import java.util.Optional;
import weighhouse.effect.Probability;

/**
 * A survival curve. Times are in any one unit, at least 0.
 *
 * <p>Source of the forms: collett, latimer-2013; each record names its own parameters.
 */
public sealed interface Curve
    permits Exponential,
        Weibull,
        Gompertz,
        LogNormal,
        LogLogistic,
        GeneralisedGamma,
        ScaledHazard,
        StretchedTime {

  /** Cumulative hazard {@code H(t) = -ln S(t)} from 0 to t; NaN below 0. */
  double cumulativeHazard(double time);

  /** Hazard {@code h(t)} per unit of time; NaN below 0; may be infinite at 0. */
  double hazard(double time);

  /**
   * The same family with one parameter changed so that every hazard is multiplied; empty where the
   * family has no such parameter.
   *
   * @param ratio above 0
   */
  Optional<Curve> withHazardRatio(double ratio);

  /** Survival {@code S(t) = exp(-H(t))}; NaN below 0. */
  default double survival(double time) {
    return Math.exp(-cumulativeHazard(time));
  }

  /**
   * Probability of the event between two times for those without it at the first: {@code 1 -
   * exp(H(from) - H(to))}.
   *
   * @param from at least 0
   * @param to at least {@code from}
   */
  default double probability(double from, double to) {
    return Probability.ofCumulativeHazard(cumulativeHazard(to) - cumulativeHazard(from));
  }

  /** The curve with every hazard multiplied, in its own family or around it. */
  default Curve proportional(double ratio) {
    return withHazardRatio(ratio).orElseGet(() -> new ScaledHazard(this, ratio));
  }

  /**
   * The curve with time stretched: {@code S(t / ratio)}.
   *
   * @param ratio time ratio (acceleration factor), above 0; above 1 prolongs survival
   */
  default Curve accelerated(double ratio) {
    return new StretchedTime(this, ratio);
  }
}
