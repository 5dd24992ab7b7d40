package weighhouse.recalculate.functions;

import org.apache.commons.math3.special.Erf;
import org.apache.commons.math3.special.Gamma;
import weighhouse.recalculate.Value;

/** The normal and log-normal distributions, and the functions of Gauss and Euler behind them. */
final class Normal {
  private static final double ROOT_TWO_PI = Math.sqrt(2 * Math.PI);

  private Normal() {}

  static void enter(Entries entries) {
    entries.general("NORM.DIST", "VVVV", a -> normal(a, a.number(0), a.logical(3), 1));
    entries.alias("NORM.DIST", "NORMDIST");
    entries.number("NORMSDIST", Normal::below);
    entries.general("NORM.S.DIST", "VV", a -> standard(a.number(0), a.logical(1)));
    entries.number("NORMSINV", Normal::quantile);
    entries.alias("NORMSINV", "NORM.S.INV");
    entries.general("NORM.INV", "VVV", a -> Coerce.of(quantile(a)));
    entries.alias("NORM.INV", "NORMINV");
    entries.general("LOGNORM.DIST", "VVVV", a -> logNormal(a, a.logical(3)));
    entries.general("LOGNORMDIST", "VVV", a -> logNormal(a, true));
    entries.general("LOGNORM.INV", "VVV", a -> Coerce.of(Math.exp(quantile(a))));
    entries.alias("LOGNORM.INV", "LOGINV");
    entries.number("PHI", x -> Math.exp(-x * x / 2) / ROOT_TWO_PI);
    entries.general("STANDARDIZE", "VVV", Normal::standardized);
    entries.general("CONFIDENCE.NORM", "VVV", Normal::confidence);
    entries.alias("CONFIDENCE.NORM", "CONFIDENCE");
    entries.number("GAMMALN", x -> x > 0 ? Gamma.logGamma(x) : Double.NaN);
    entries.alias("GAMMALN", "GAMMALN.PRECISE");
    entries.number("GAMMA", x -> x <= 0 && x == Math.rint(x) ? Double.NaN : Gamma.gamma(x));
    entries.general("ERF", "Vv", a -> Coerce.of(erf(a)));
    entries.number("ERF.PRECISE", Erf::erf);
    entries.number("ERFC", Erf::erfc);
    entries.alias("ERFC", "ERFC.PRECISE");
  }

  /** Probability below a number of standard deviations; accurate in both tails. */
  static double below(double z) {
    return Erf.erfc(-z / Math.sqrt(2)) / 2;
  }

  /**
   * Standard deviations below which a probability lies, by the library's inverse and one step of
   * Halley's method, which mends its tails.
   */
  static double quantile(double p) {
    if (!(p > 0 && p < 1)) {
      return Double.NaN;
    }
    if (p > 0.5) {
      return -quantile(1 - p);
    }
    double z = -Math.sqrt(2) * Erf.erfcInv(2 * p);
    double error = (below(z) - p) * ROOT_TWO_PI * Math.exp(z * z / 2);
    return z - error / (1 + z * error / 2);
  }

  private static double deviation(Arguments a) {
    double deviation = a.number(2);
    if (deviation <= 0) {
      throw Fault.NUM.exception();
    }
    return deviation;
  }

  private static double quantile(Arguments a) {
    return a.number(1) + deviation(a) * quantile(a.number(0));
  }

  private static Value normal(Arguments a, double x, boolean cumulative, double divisor) {
    double z = (x - a.number(1)) / deviation(a);
    return Coerce.of(
        cumulative ? below(z) : Math.exp(-z * z / 2) / (ROOT_TWO_PI * deviation(a) * divisor));
  }

  private static Value standard(double z, boolean cumulative) {
    return Coerce.of(cumulative ? below(z) : Math.exp(-z * z / 2) / ROOT_TWO_PI);
  }

  private static Value logNormal(Arguments a, boolean cumulative) {
    double x = a.number(0);
    if (x <= 0) {
      throw Fault.NUM.exception();
    }
    return normal(a, Math.log(x), cumulative, x);
  }

  private static Value standardized(Arguments a) {
    return Coerce.of((a.number(0) - a.number(1)) / deviation(a));
  }

  private static Value confidence(Arguments a) {
    double alpha = a.number(0);
    double size = Math.floor(a.number(2));
    if (!(alpha > 0 && alpha < 1) || a.number(1) <= 0 || size < 1) {
      throw Fault.NUM.exception();
    }
    return Coerce.of(-quantile(alpha / 2) * a.number(1) / Math.sqrt(size));
  }

  private static double erf(Arguments a) {
    return a.missing(1) ? Erf.erf(a.number(0)) : Erf.erf(a.number(0), a.number(1));
  }
}
