package weighhouse.recalculate.functions;

import java.util.Arrays;
import weighhouse.recalculate.Value;

/** Order statistics: percentiles, ranks, the k-th largest. */
final class Ranks {
  private Ranks() {}

  static void enter(Entries entries) {
    entries.general("LARGE", "RV", a -> nth(a, true));
    entries.general("SMALL", "RV", a -> nth(a, false));
    entries.general("PERCENTILE.INC", "RV", a -> inclusive(sorted(a), a.number(1)));
    entries.alias("PERCENTILE.INC", "PERCENTILE");
    entries.general("PERCENTILE.EXC", "RV", a -> exclusive(sorted(a), a.number(1)));
    entries.general("QUARTILE.INC", "RV", a -> inclusive(sorted(a), a.integer(1) / 4.0));
    entries.alias("QUARTILE.INC", "QUARTILE");
    entries.general("QUARTILE.EXC", "RV", a -> exclusive(sorted(a), a.integer(1) / 4.0));
    entries.general("RANK.EQ", "VRv", a -> rank(a, false));
    entries.alias("RANK.EQ", "RANK");
    entries.general("RANK.AVG", "VRv", a -> rank(a, true));
    entries.general("PERCENTRANK.INC", "RVv", Ranks::percentRank);
    entries.alias("PERCENTRANK.INC", "PERCENTRANK");
    entries.general("FREQUENCY", "AA", Ranks::frequency);
  }

  private static double[] sorted(Arguments a) {
    double[] numbers = Numbers.in(a, 0);
    if (numbers.length == 0) {
      throw Fault.NUM.exception();
    }
    Arrays.sort(numbers);
    return numbers;
  }

  private static Value nth(Arguments a, boolean largest) {
    double[] sorted = sorted(a);
    int n = (int) Math.ceil(a.number(1));
    if (n < 1 || n > sorted.length) {
      throw Fault.NUM.exception();
    }
    return Coerce.of(largest ? sorted[sorted.length - n] : sorted[n - 1]);
  }

  /** Between the two nearest of n numbers, the first at 0 and the last at 1. */
  static Value inclusive(double[] sorted, double share) {
    if (!(share >= 0 && share <= 1)) {
      throw Fault.NUM.exception();
    }
    return Coerce.of(between(sorted, share * (sorted.length - 1)));
  }

  /** The same with the first at 1/(n+1). */
  static Value exclusive(double[] sorted, double share) {
    double position = share * (sorted.length + 1) - 1;
    if (!(share > 0 && share < 1) || position < 0 || position > sorted.length - 1) {
      throw Fault.NUM.exception();
    }
    return Coerce.of(between(sorted, position));
  }

  private static double between(double[] sorted, double position) {
    int below = (int) Math.floor(position);
    int above = Math.min(below + 1, sorted.length - 1);
    return sorted[below] + (position - below) * (sorted[above] - sorted[below]);
  }

  private static Value rank(Arguments a, boolean average) {
    double number = a.number(0);
    double[] numbers = Numbers.in(a, 1);
    boolean ascending = a.number(2, 0) != 0;
    long before = Arrays.stream(numbers).filter(n -> ascending ? n < number : n > number).count();
    long equal = Arrays.stream(numbers).filter(n -> n == number).count();
    if (equal == 0) {
      throw Fault.NA.exception();
    }
    return Coerce.of(before + 1 + (average ? (equal - 1) / 2.0 : 0));
  }

  private static Value percentRank(Arguments a) {
    double[] sorted = sorted(a);
    double x = a.number(1);
    if (x < sorted[0] || x > sorted[sorted.length - 1]) {
      throw Fault.NA.exception();
    }
    int below = 0;
    while (below + 1 < sorted.length && sorted[below + 1] <= x) {
      below++;
    }
    while (below > 0 && sorted[below - 1] == x) {
      below--;
    }
    double part =
        sorted[below] == x ? 0 : (x - sorted[below]) / (sorted[below + 1] - sorted[below]);
    double unit = Math.pow(10, a.integer(2, 3));
    double rank = sorted.length == 1 ? 1 : (below + part) / (sorted.length - 1);
    return Coerce.of(Math.floor(rank * unit + 1e-9) / unit);
  }

  private static Value frequency(Arguments a) {
    double[] data = Numbers.in(a, 0);
    double[] bins = Numbers.in(a, 1);
    double[] limits = bins.clone();
    Arrays.sort(limits);
    Value[][] counts = new Value[bins.length + 1][1];
    double below = Double.NEGATIVE_INFINITY;
    for (int i = 0; i <= limits.length; i++) {
      double from = below;
      double to = i < limits.length ? limits[i] : Double.POSITIVE_INFINITY;
      long count = Arrays.stream(data).filter(n -> n > from && n <= to).count();
      counts[i][0] = new Value.Num((double) count);
      below = to;
    }
    return new Value.Array(counts);
  }
}
