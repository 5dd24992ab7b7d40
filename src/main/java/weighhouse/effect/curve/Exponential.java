package weighhouse.effect.curve;

import java.util.Optional;

/**
 * Constant hazard: {@code S(t) = exp(-rate * t)}. The rate carries a hazard ratio.
 *
 * @param rate per unit of time, above 0
 */
public record Exponential(double rate) implements Curve {
  public Exponential {
    Parameters.requirePositive("rate", rate);
  }

  @Override
  public double cumulativeHazard(double time) {
    return rate * Parameters.time(time);
  }

  @Override
  public double hazard(double time) {
    return time >= 0 ? rate : Double.NaN;
  }

  @Override
  public Optional<Curve> withHazardRatio(double ratio) {
    return Optional.of(new Exponential(rate * ratio));
  }
}
