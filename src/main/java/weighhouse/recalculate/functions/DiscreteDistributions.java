package weighhouse.recalculate.functions;

import org.apache.commons.math3.distribution.BinomialDistribution;
import org.apache.commons.math3.distribution.HypergeometricDistribution;
import org.apache.commons.math3.distribution.IntegerDistribution;
import org.apache.commons.math3.distribution.PascalDistribution;
import org.apache.commons.math3.distribution.PoissonDistribution;
import org.apache.commons.math3.exception.MathIllegalArgumentException;
import org.apache.commons.math3.special.Gamma;
import weighhouse.recalculate.Value;

/** Distributions of counts. */
final class DiscreteDistributions {
  private DiscreteDistributions() {}

  static void enter(Entries entries) {
    entries.general("POISSON.DIST", "VVV", DiscreteDistributions::poisson);
    entries.alias("POISSON.DIST", "POISSON");
    entries.general("BINOM.DIST", "VVVV", DiscreteDistributions::binomial);
    entries.alias("BINOM.DIST", "BINOMDIST");
    entries.general("BINOM.INV", "VVV", DiscreteDistributions::binomialQuantile);
    entries.alias("BINOM.INV", "CRITBINOM");
    entries.general("NEGBINOM.DIST", "VVVV", a -> negativeBinomial(a, a.logical(3)));
    entries.general("NEGBINOMDIST", "VVV", a -> negativeBinomial(a, false));
    entries.general("HYPGEOM.DIST", "VVVVV", a -> hypergeometric(a, a.logical(4)));
    entries.general("HYPGEOMDIST", "VVVV", a -> hypergeometric(a, false));
  }

  private static Value of(IntegerDistribution distribution, int count, boolean cumulative) {
    return Coerce.of(
        cumulative ? distribution.cumulativeProbability(count) : distribution.probability(count));
  }

  private static int count(Arguments a, int index) {
    int count = a.integer(index);
    if (count < 0) {
      throw Fault.NUM.exception();
    }
    return count;
  }

  private static double probability(Arguments a, int index) {
    double probability = a.number(index);
    if (!(probability >= 0 && probability <= 1)) {
      throw Fault.NUM.exception();
    }
    return probability;
  }

  private static Value poisson(Arguments a) {
    int count = count(a, 0);
    double mean = a.number(1);
    if (mean < 0) {
      throw Fault.NUM.exception();
    }
    if (mean == 0) {
      return Coerce.of(a.logical(2) || count == 0 ? 1 : 0);
    }
    return a.logical(2)
        ? Coerce.of(Gamma.regularizedGammaQ(count + 1.0, mean))
        : Coerce.of(new PoissonDistribution(mean).probability(count));
  }

  private static Value binomial(Arguments a) {
    int trials = count(a, 1);
    if (count(a, 0) > trials) {
      throw Fault.NUM.exception();
    }
    return of(new BinomialDistribution(null, trials, probability(a, 2)), count(a, 0), a.logical(3));
  }

  private static Value binomialQuantile(Arguments a) {
    BinomialDistribution distribution =
        new BinomialDistribution(null, count(a, 0), probability(a, 1));
    return Coerce.of(distribution.inverseCumulativeProbability(probability(a, 2)));
  }

  private static Value negativeBinomial(Arguments a, boolean cumulative) {
    try {
      return of(
          new PascalDistribution(null, count(a, 1), probability(a, 2)), count(a, 0), cumulative);
    } catch (MathIllegalArgumentException e) {
      return Fault.NUM.value();
    }
  }

  private static Value hypergeometric(Arguments a, boolean cumulative) {
    try {
      return of(
          new HypergeometricDistribution(null, count(a, 3), count(a, 2), count(a, 1)),
          count(a, 0),
          cumulative);
    } catch (MathIllegalArgumentException e) {
      return Fault.NUM.value();
    }
  }
}
