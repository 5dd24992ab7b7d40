package weighhouse.effect.curve;

import java.util.Optional;

/**
 * Weibull: {@code S(t) = exp(-(t/scale)^shape)}, which is {@code exp(-lambda * t^shape)} with
 * {@code lambda = scale^-shape}. In the lambda form a hazard ratio multiplies lambda; in the scale
 * form it makes the scale {@code scale * HR^(-1/shape)}, and a time ratio multiplies the scale.
 *
 * @param shape above 0; 1 is the exponential
 * @param scale in units of time, above 0
 */
public record Weibull(double shape, double scale) implements Curve {
  public Weibull {
    Parameters.requirePositive("shape", shape);
    Parameters.requirePositive("scale", scale);
  }

  /** From the form {@code exp(-lambda * t^shape)}. */
  public static Weibull ofLambda(double lambda, double shape) {
    Parameters.requirePositive("lambda", lambda);
    return new Weibull(shape, Math.pow(lambda, -1 / shape));
  }

  /** The parameter of the form {@code exp(-lambda * t^shape)}. */
  public double lambda() {
    return Math.pow(scale, -shape);
  }

  /** The hazard ratio that a time ratio amounts to: {@code ratio^-shape}. */
  public double hazardRatioOfTimeRatio(double timeRatio) {
    return Math.pow(timeRatio, -shape);
  }

  @Override
  public double cumulativeHazard(double time) {
    return Math.pow(Parameters.time(time) / scale, shape);
  }

  @Override
  public double hazard(double time) {
    return shape / scale * Math.pow(Parameters.time(time) / scale, shape - 1);
  }

  @Override
  public Optional<Curve> withHazardRatio(double ratio) {
    return Optional.of(new Weibull(shape, scale * Math.pow(ratio, -1 / shape)));
  }

  @Override
  public Curve accelerated(double ratio) {
    return new Weibull(shape, scale * ratio);
  }
}
