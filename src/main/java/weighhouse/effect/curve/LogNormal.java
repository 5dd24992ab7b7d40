package weighhouse.effect.curve;

import java.util.Optional;
import weighhouse.effect.StandardNormal;

/**
 * Log-normal: {@code S(t) = 1 - Phi((ln t - mu) / sigma)}. No parameter carries a hazard ratio; a
 * time ratio adds its logarithm to mu. Survival is exact to about 1e-14 relative down to 1e-300.
 *
 * @param mu mean of ln t
 * @param sigma standard deviation of ln t, above 0
 */
public record LogNormal(double mu, double sigma) implements Curve {
  public LogNormal {
    Parameters.requireFinite("mu", mu);
    Parameters.requirePositive("sigma", sigma);
  }

  @Override
  public double survival(double time) {
    return StandardNormal.upperTail(standardised(time));
  }

  @Override
  public double cumulativeHazard(double time) {
    double z = standardised(time);
    return z < 0
        ? -Math.log1p(-StandardNormal.upperTail(-z))
        : -Math.log(StandardNormal.upperTail(z));
  }

  @Override
  public double hazard(double time) {
    if (time == 0) {
      return 0;
    }
    double z = standardised(time);
    return StandardNormal.density(z) / (sigma * time * StandardNormal.upperTail(z));
  }

  @Override
  public Optional<Curve> withHazardRatio(double ratio) {
    return Optional.empty();
  }

  @Override
  public Curve accelerated(double ratio) {
    return new LogNormal(mu + Math.log(ratio), sigma);
  }

  private double standardised(double time) {
    return (Math.log(Parameters.time(time)) - mu) / sigma;
  }
}
