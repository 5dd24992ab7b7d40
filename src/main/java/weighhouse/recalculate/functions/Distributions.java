package weighhouse.recalculate.functions;

import org.apache.commons.math3.distribution.BetaDistribution;
import org.apache.commons.math3.distribution.ChiSquaredDistribution;
import org.apache.commons.math3.distribution.ExponentialDistribution;
import org.apache.commons.math3.distribution.FDistribution;
import org.apache.commons.math3.distribution.GammaDistribution;
import org.apache.commons.math3.distribution.RealDistribution;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.distribution.WeibullDistribution;
import org.apache.commons.math3.exception.MathIllegalArgumentException;
import org.apache.commons.math3.exception.MathIllegalStateException;
import weighhouse.recalculate.Value;

/**
 * Continuous distributions as Excel parametrizes them; each function's arguments end with the
 * distribution's parameters. Outside its domain a function gives {@code #NUM!}.
 */
final class Distributions {
  /** Absolute accuracy of quantiles: small event probabilities have beta quantiles near 0. */
  private static final double ACCURACY = 1e-15;

  private static final int POLISHING = 3;

  private Distributions() {}

  static void enter(Entries entries) {
    beta(entries);
    gamma(entries);
    others(entries);
    chiSquared(entries);
    f(entries);
    student(entries);
  }

  private interface Family {
    RealDistribution of(Arguments a, int first);
  }

  private static double checked(double probability) {
    if (!(probability >= 0 && probability <= 1)) {
      throw Fault.NUM.exception();
    }
    return probability;
  }

  /** Density or cumulative probability at argument 0, by the truth value at another. */
  private static Value at(Arguments a, Family family, int cumulative) {
    return guarded(
        () -> {
          RealDistribution distribution = family.of(a, 1);
          double x = a.number(0);
          return a.logical(cumulative)
              ? distribution.cumulativeProbability(x)
              : distribution.density(x);
        });
  }

  private static Value above(Arguments a, Family family) {
    return guarded(() -> 1 - family.of(a, 1).cumulativeProbability(a.number(0)));
  }

  private static Value quantile(Arguments a, Family family) {
    return guarded(() -> inverse(family.of(a, 1), checked(a.number(0))));
  }

  private static Value upperQuantile(Arguments a, Family family) {
    return guarded(() -> inverse(family.of(a, 1), 1 - checked(a.number(0))));
  }

  /** The library's quantile, whose accuracy is absolute, made relative by steps of Newton. */
  private static double inverse(RealDistribution distribution, double p) {
    double x = distribution.inverseCumulativeProbability(p);
    for (int i = 0; i < POLISHING && p > 0 && p < 1; i++) {
      double density = distribution.density(x);
      double step = (distribution.cumulativeProbability(x) - p) / density;
      boolean sound = density > 0 && Math.abs(step) < Math.abs(x) / 2;
      if (!sound) {
        return x;
      }
      x -= step;
    }
    return x;
  }

  private static Value guarded(java.util.function.DoubleSupplier calculation) {
    try {
      return Coerce.of(calculation.getAsDouble());
    } catch (MathIllegalArgumentException | MathIllegalStateException e) {
      return Fault.NUM.value();
    }
  }

  private static void beta(Entries entries) {
    Family family = (a, i) -> new BetaDistribution(null, a.number(i), a.number(i + 1), ACCURACY);
    entries.general("BETA.DIST", "VVVVvv", a -> scaled(a, family, 4, a.logical(3)));
    entries.general("BETADIST", "VVVvv", a -> scaled(a, family, 3, true));
    entries.general("BETA.INV", "VVVvv", a -> betaQuantile(a, family));
    entries.alias("BETA.INV", "BETAINV");
  }

  /** The beta distribution between two limits other than 0 and 1. */
  private static Value scaled(Arguments a, Family family, int limits, boolean cumulative) {
    double low = a.number(limits, 0);
    double high = a.number(limits + 1, 1);
    double x = (a.number(0) - low) / (high - low);
    if (high <= low || x < 0 || x > 1) {
      throw Fault.NUM.exception();
    }
    return guarded(
        () ->
            cumulative
                ? family.of(a, 1).cumulativeProbability(x)
                : family.of(a, 1).density(x) / (high - low));
  }

  private static Value betaQuantile(Arguments a, Family family) {
    double p = a.number(0);
    double low = a.number(3, 0);
    double high = a.number(4, 1);
    if (!(p > 0 && p <= 1) || high <= low) {
      throw Fault.NUM.exception();
    }
    return guarded(() -> low + (high - low) * inverse(family.of(a, 1), p));
  }

  private static void gamma(Entries entries) {
    Family family = (a, i) -> new GammaDistribution(null, a.number(i), a.number(i + 1), ACCURACY);
    entries.general("GAMMA.DIST", "VVVV", a -> at(a, family, 3));
    entries.general("GAMMA.INV", "VVV", a -> quantile(a, family));
    entries.alias("GAMMA.DIST", "GAMMADIST");
    entries.alias("GAMMA.INV", "GAMMAINV");
  }

  private static void others(Entries entries) {
    Family weibull = (a, i) -> new WeibullDistribution(a.number(i), a.number(i + 1));
    entries.general("WEIBULL.DIST", "VVVV", a -> at(positive(a), weibull, 3));
    entries.alias("WEIBULL.DIST", "WEIBULL");
    // Excel takes the rate, the library the mean
    Family exponential = (a, i) -> new ExponentialDistribution(null, 1 / a.number(i), ACCURACY);
    entries.general("EXPON.DIST", "VVV", a -> at(positive(a), exponential, 2));
    entries.alias("EXPON.DIST", "EXPONDIST");
  }

  private static Arguments positive(Arguments a) {
    if (a.number(0) < 0) {
      throw Fault.NUM.exception();
    }
    return a;
  }

  private static double degrees(Arguments a, int index) {
    double degrees = Math.floor(a.number(index));
    if (degrees < 1) {
      throw Fault.NUM.exception();
    }
    return degrees;
  }

  private static void chiSquared(Entries entries) {
    Family family = (a, i) -> new ChiSquaredDistribution(null, degrees(a, i), ACCURACY);
    entries.general("CHISQ.DIST", "VVV", a -> at(positive(a), family, 2));
    entries.general("CHISQ.DIST.RT", "VV", a -> above(positive(a), family));
    entries.alias("CHISQ.DIST.RT", "CHIDIST");
    entries.general("CHISQ.INV", "VV", a -> quantile(a, family));
    entries.general("CHISQ.INV.RT", "VV", a -> upperQuantile(a, family));
    entries.alias("CHISQ.INV.RT", "CHIINV");
  }

  private static void f(Entries entries) {
    Family family = (a, i) -> new FDistribution(null, degrees(a, i), degrees(a, i + 1), ACCURACY);
    entries.general("F.DIST", "VVVV", a -> at(positive(a), family, 3));
    entries.general("F.DIST.RT", "VVV", a -> above(positive(a), family));
    entries.alias("F.DIST.RT", "FDIST");
    entries.general("F.INV", "VVV", a -> quantile(a, family));
    entries.general("F.INV.RT", "VVV", a -> upperQuantile(a, family));
    entries.alias("F.INV.RT", "FINV");
  }

  private static void student(Entries entries) {
    Family family = (a, i) -> new TDistribution(null, degrees(a, i), ACCURACY);
    entries.general("T.DIST", "VVV", a -> at(a, family, 2));
    entries.general("T.DIST.RT", "VV", a -> above(a, family));
    entries.general("T.DIST.2T", "VV", a -> twoTails(positive(a), family));
    entries.general("TDIST", "VVV", a -> tails(positive(a), family));
    entries.general("T.INV", "VV", a -> quantile(a, family));
    entries.general("T.INV.2T", "VV", a -> twoTailedQuantile(a, family));
    entries.alias("T.INV.2T", "TINV");
    entries.general("GAUSS", "V", a -> Coerce.of(Normal.below(a.number(0)) - 0.5));
  }

  private static Value twoTails(Arguments a, Family family) {
    return guarded(() -> 2 * family.of(a, 1).cumulativeProbability(-a.number(0)));
  }

  private static Value tails(Arguments a, Family family) {
    int tails = a.integer(2);
    if (tails != 1 && tails != 2) {
      throw Fault.NUM.exception();
    }
    return tails == 2
        ? twoTails(a, family)
        : guarded(() -> family.of(a, 1).cumulativeProbability(-a.number(0)));
  }

  private static Value twoTailedQuantile(Arguments a, Family family) {
    double p = a.number(0);
    if (!(p > 0 && p <= 1)) {
      throw Fault.NUM.exception();
    }
    return guarded(() -> -inverse(family.of(a, 1), p / 2));
  }
}
