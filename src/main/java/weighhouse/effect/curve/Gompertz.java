package weighhouse.effect.curve;

import java.util.Optional;

/**
 * Gompertz: {@code h(t) = rate * exp(shape * t)}, {@code S(t) = exp(-rate/shape * (exp(shape*t) -
 * 1))}. The rate carries a hazard ratio. With a negative shape a share {@code exp(rate/shape)}
 * never has the event.
 *
 * @param shape per unit of time, any sign; 0 is the exponential
 * @param rate hazard at time 0 per unit of time, above 0
 */
public record Gompertz(double shape, double rate) implements Curve {
  public Gompertz {
    Parameters.requireFinite("shape", shape);
    Parameters.requirePositive("rate", rate);
  }

  @Override
  public double cumulativeHazard(double time) {
    double t = Parameters.time(time);
    return shape == 0 ? rate * t : rate * Math.expm1(shape * t) / shape;
  }

  @Override
  public double hazard(double time) {
    return rate * Math.exp(shape * Parameters.time(time));
  }

  @Override
  public Optional<Curve> withHazardRatio(double ratio) {
    return Optional.of(new Gompertz(shape, rate * ratio));
  }
}
