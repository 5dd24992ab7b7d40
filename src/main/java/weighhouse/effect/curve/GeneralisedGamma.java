package weighhouse.effect.curve;

import java.util.Optional;
import org.apache.commons.math3.special.Gamma;

/**
 * Generalised gamma in Prentice's form: with {@code w = (ln t - mu)/sigma} and {@code u = exp(q*w)
 * / q^2}, survival is the upper regularised incomplete gamma function of {@code (1/q^2, u)} for q
 * above 0, and the lower one for q below 0. q = 1 is the Weibull, q = 0 the log-normal. No
 * parameter carries a hazard ratio in general. Near q = 0 (below 1e-3 in size) the log-normal limit
 * is taken, with an error of the order of q.
 *
 * <p>Source: Prentice RL, Biometrika 1974;61:539-544 (from memory).
 *
 * @param mu location of ln t
 * @param sigma spread of ln t, above 0
 * @param q shape, any sign
 */
public record GeneralisedGamma(double mu, double sigma, double q) implements Curve {
  private static final double LOG_NORMAL_BELOW = 1e-3;
  private static final double PRECISION = 1e-15;
  private static final int MOST_TERMS = 100_000;

  public GeneralisedGamma {
    Parameters.requireFinite("mu", mu);
    Parameters.requirePositive("sigma", sigma);
    Parameters.requireFinite("q", q);
  }

  @Override
  public double survival(double time) {
    return isLogNormal() ? logNormal().survival(time) : gamma(time, q > 0);
  }

  @Override
  public double cumulativeHazard(double time) {
    if (isLogNormal()) {
      return logNormal().cumulativeHazard(time);
    }
    double event = gamma(time, q < 0);
    return event < 0.5 ? -Math.log1p(-event) : -Math.log(gamma(time, q > 0));
  }

  @Override
  public double hazard(double time) {
    if (isLogNormal() || !(time > 0)) {
      return logNormal().hazard(time);
    }
    double k = 1 / (q * q);
    double logU = q * standardised(time) + Math.log(k);
    double logDensity =
        Math.log(Math.abs(q) / (sigma * time)) + k * logU - Math.exp(logU) - Gamma.logGamma(k);
    return Math.exp(logDensity + cumulativeHazard(time));
  }

  @Override
  public Optional<Curve> withHazardRatio(double ratio) {
    return q == 1 ? new Weibull(1 / sigma, Math.exp(mu)).withHazardRatio(ratio) : Optional.empty();
  }

  @Override
  public Curve accelerated(double ratio) {
    return new GeneralisedGamma(mu + Math.log(ratio), sigma, q);
  }

  private double gamma(double time, boolean upper) {
    double k = 1 / (q * q);
    double u = k * Math.exp(q * standardised(time));
    if (u == 0 || u == Double.POSITIVE_INFINITY) {
      return upper == (u == 0) ? 1 : 0;
    }
    return upper
        ? Gamma.regularizedGammaQ(k, u, PRECISION, MOST_TERMS)
        : Gamma.regularizedGammaP(k, u, PRECISION, MOST_TERMS);
  }

  private double standardised(double time) {
    return (Math.log(Parameters.time(time)) - mu) / sigma;
  }

  private boolean isLogNormal() {
    return Math.abs(q) < LOG_NORMAL_BELOW;
  }

  private LogNormal logNormal() {
    return new LogNormal(mu, sigma);
  }
}
