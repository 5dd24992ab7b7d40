package weighhouse.effect.curve;

import java.util.Optional;

/**
 * Log-logistic: {@code S(t) = 1 / (1 + (t/scale)^shape)}. No parameter carries a hazard ratio; a
 * time ratio multiplies the scale, and the odds of the event are proportional: an odds ratio makes
 * the scale {@code scale * OR^(-1/shape)}.
 *
 * @param shape above 0
 * @param scale the median, in units of time, above 0
 */
public record LogLogistic(double shape, double scale) implements Curve {
  public LogLogistic {
    Parameters.requirePositive("shape", shape);
    Parameters.requirePositive("scale", scale);
  }

  @Override
  public double cumulativeHazard(double time) {
    return Math.log1p(Math.pow(Parameters.time(time) / scale, shape));
  }

  @Override
  public double hazard(double time) {
    double x = Parameters.time(time) / scale;
    return shape / scale * Math.pow(x, shape - 1) / (1 + Math.pow(x, shape));
  }

  @Override
  public Optional<Curve> withHazardRatio(double ratio) {
    return Optional.empty();
  }

  @Override
  public Curve accelerated(double ratio) {
    return new LogLogistic(shape, scale * ratio);
  }

  /** The curve with the odds of the event multiplied at every time. */
  public LogLogistic withOddsRatio(double ratio) {
    return new LogLogistic(shape, scale * Math.pow(ratio, -1 / shape));
  }
}
