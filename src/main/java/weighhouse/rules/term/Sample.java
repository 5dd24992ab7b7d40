package weighhouse.rules.term;

import java.util.Arrays;

/**
 * One point at which terms are evaluated: every symbol has a number of its own, drawn from its
 * identity and the sample's seed, unless one was set. Numbers lie between 0.15 and 0.85, where
 * logarithms, roots and complements of probabilities are all defined.
 */
public final class Sample {
  private static final double LOW = 0.15;
  private static final double WIDTH = 0.7;

  private final int seed;
  private double[] values;

  public Sample(int seed, int terms) {
    this.seed = seed;
    this.values = new double[terms];
    Arrays.fill(values, Double.NaN);
  }

  /** Fixes the value of one term, whatever its parts. */
  public Sample with(Term term, double value) {
    ensure(term.id());
    values[term.id()] = value;
    return this;
  }

  /** The value of a term at this point; NaN where it is not defined. */
  public double of(Term term) {
    ensure(term.id());
    double known = values[term.id()];
    if (!Double.isNaN(known)) {
      return known;
    }
    double value = compute(term);
    values[term.id()] = value;
    return value;
  }

  private void ensure(int id) {
    if (id >= values.length) {
      int old = values.length;
      values = Arrays.copyOf(values, Math.max(id + 1, 2 * old));
      Arrays.fill(values, old, values.length, Double.NaN);
    }
  }

  private double compute(Term term) {
    return switch (term.operation()) {
      case NUMBER -> term.number();
      case SYMBOL -> drawn(term.id());
      case SUM -> part(term, 0) + part(term, 1);
      case PRODUCT -> part(term, 0) * part(term, 1);
      case POWER -> Math.pow(part(term, 0), part(term, 1));
      case EXP -> Math.exp(part(term, 0));
      case LN -> Math.log(part(term, 0));
      case ABS -> Math.abs(part(term, 0));
      case MIN -> term.parts().stream().mapToDouble(this::of).min().orElse(Double.NaN);
      case MAX -> term.parts().stream().mapToDouble(this::of).max().orElse(Double.NaN);
      case SELECT -> selected(term);
      case OPAQUE -> scattered(term);
    };
  }

  private double part(Term term, int index) {
    return of(term.parts().get(index));
  }

  /** Different samples take different branches; one sample always takes the same. */
  private double selected(Term term) {
    int branches = term.parts().size() - 1;
    int branch = Math.floorMod(seed + term.parts().get(0).id(), branches);
    return part(term, 1 + branch);
  }

  /** Any change of any part changes an unknown function, and in no regular way. */
  private double scattered(Term term) {
    long mixed = term.symbol().hashCode();
    for (Term part : term.parts()) {
      mixed = 31 * mixed + Double.hashCode(of(part));
    }
    return drawn(mixed);
  }

  /** A number that looks random but is the same in every run. */
  private double drawn(long identity) {
    long mixed = (identity * 0x9E3779B97F4A7C15L) ^ (seed * 0xC2B2AE3D27D4EB4FL);
    mixed = (mixed ^ (mixed >>> 29)) * 0xBF58476D1CE4E5B9L;
    mixed = (mixed ^ (mixed >>> 32)) * 0x94D049BB133111EBL;
    return LOW + WIDTH * ((mixed >>> 11) * 0x1.0p-53);
  }
}
