package weighhouse.recalculate.functions;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.stat.StatUtils;
import weighhouse.recalculate.Value;

/** Measures of location, spread and rank. */
final class StatisticsFunctions {
  private StatisticsFunctions() {}

  static void enter(Entries entries) {
    spread(entries);
    of(entries, "MEDIAN", 1, StatisticsFunctions::median);
    of(entries, "GEOMEAN", 1, n -> onlyPositive(n, Math.exp(meanLog(n))));
    of(entries, "HARMEAN", 1, n -> onlyPositive(n, 1 / StatUtils.mean(reciprocals(n))));
    of(entries, "MODE.SNGL", 1, StatisticsFunctions::mode);
    entries.alias("MODE.SNGL", "MODE");
    of(
        entries,
        "SKEW",
        3,
        n -> new org.apache.commons.math3.stat.descriptive.moment.Skewness().evaluate(n));
    of(
        entries,
        "KURT",
        4,
        n -> new org.apache.commons.math3.stat.descriptive.moment.Kurtosis().evaluate(n));
    entries.general("TRIMMEAN", "RV", a -> trimmed(Numbers.in(a, 0), a.number(1)));
    everyValue(entries);
    Ranks.enter(entries);
  }

  private static void of(
      Entries entries, String name, int least, ToDoubleFunction<double[]> statistic) {
    entries.general(
        name,
        "R+",
        a -> {
          double[] numbers = Numbers.of(a, 0);
          if (numbers.length < least) {
            return numbers.length == 0 && least == 1 ? Fault.NUM.value() : Fault.DIV0.value();
          }
          return Coerce.of(statistic.applyAsDouble(numbers));
        });
  }

  private static void spread(Entries entries) {
    of(entries, "STDEV.S", 2, n -> Math.sqrt(StatUtils.variance(n)));
    entries.alias("STDEV.S", "STDEV");
    of(entries, "STDEV.P", 1, n -> Math.sqrt(StatUtils.populationVariance(n)));
    entries.alias("STDEV.P", "STDEVP");
    of(entries, "VAR.S", 2, StatUtils::variance);
    entries.alias("VAR.S", "VAR");
    of(entries, "VAR.P", 1, StatUtils::populationVariance);
    entries.alias("VAR.P", "VARP");
    of(entries, "DEVSQ", 1, n -> StatUtils.populationVariance(n) * n.length);
    of(entries, "AVEDEV", 1, StatisticsFunctions::meanDeviation);
  }

  /** Those that count text as 0 and TRUE as 1 in ranges. */
  private static void everyValue(Entries entries) {
    entries.general("AVERAGEA", "R+", a -> SumFunctions.mean(Numbers.all(a)));
    entries.general("MAXA", "R+", a -> Coerce.of(Arrays.stream(Numbers.all(a)).max().orElse(0)));
    entries.general("MINA", "R+", a -> Coerce.of(Arrays.stream(Numbers.all(a)).min().orElse(0)));
    entries.general("STDEVA", "R+", a -> Coerce.of(Math.sqrt(StatUtils.variance(Numbers.all(a)))));
    entries.general("VARA", "R+", a -> Coerce.of(StatUtils.variance(Numbers.all(a))));
  }

  static double median(double[] numbers) {
    double[] sorted = numbers.clone();
    Arrays.sort(sorted);
    int middle = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
  }

  private static double onlyPositive(double[] numbers, double result) {
    return Arrays.stream(numbers).allMatch(n -> n > 0) ? result : Double.NaN;
  }

  private static double meanLog(double[] numbers) {
    return Arrays.stream(numbers).map(Math::log).average().orElse(Double.NaN);
  }

  private static double[] reciprocals(double[] numbers) {
    return Arrays.stream(numbers).map(n -> 1 / n).toArray();
  }

  private static double meanDeviation(double[] numbers) {
    double mean = StatUtils.mean(numbers);
    return Arrays.stream(numbers).map(n -> Math.abs(n - mean)).average().orElse(Double.NaN);
  }

  private static double mode(double[] numbers) {
    Map<Double, Integer> counts = new HashMap<>();
    Arrays.stream(numbers).forEach(n -> counts.merge(n, 1, Integer::sum));
    int most = counts.values().stream().mapToInt(Integer::intValue).max().orElse(0);
    if (most < 2) {
      throw Fault.NA.exception();
    }
    return Arrays.stream(numbers).filter(n -> counts.get(n) == most).findFirst().orElseThrow();
  }

  private static Value trimmed(double[] numbers, double share) {
    if (!(share >= 0 && share < 1) || numbers.length == 0) {
      throw Fault.NUM.exception();
    }
    Arrays.sort(numbers);
    int cut = (int) Math.floor(numbers.length * share / 2);
    return SumFunctions.mean(Arrays.copyOfRange(numbers, cut, numbers.length - cut));
  }
}
