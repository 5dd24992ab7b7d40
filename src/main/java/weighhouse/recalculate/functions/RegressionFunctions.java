package weighhouse.recalculate.functions;

import org.apache.commons.math3.stat.regression.SimpleRegression;
import weighhouse.recalculate.Value;

/** Correlation and straight lines through pairs of numbers. */
final class RegressionFunctions {
  private RegressionFunctions() {}

  static void enter(Entries entries) {
    entries.general("SLOPE", "AA", a -> finite(line(a, 1, 0).getSlope()));
    entries.general("INTERCEPT", "AA", a -> finite(line(a, 1, 0).getIntercept()));
    entries.general("RSQ", "AA", a -> finite(line(a, 1, 0).getRSquare()));
    entries.general("CORREL", "AA", a -> finite(line(a, 0, 1).getR()));
    entries.alias("CORREL", "PEARSON");
    entries.general("STEYX", "AA", a -> finite(Math.sqrt(line(a, 1, 0).getMeanSquareError())));
    entries.general("FORECAST.LINEAR", "VAA", a -> finite(line(a, 2, 1).predict(a.number(0))));
    entries.alias("FORECAST.LINEAR", "FORECAST");
    entries.general("COVARIANCE.P", "AA", a -> covariance(a, 0));
    entries.alias("COVARIANCE.P", "COVAR");
    entries.general("COVARIANCE.S", "AA", a -> covariance(a, 1));
    entries.general("LINEST", "Aavv", a -> LeastSquares.table(a, false));
    entries.general("LOGEST", "Aavv", a -> LeastSquares.table(a, true));
    entries.general("TREND", "Aaav", a -> LeastSquares.predicted(a, false));
    entries.general("GROWTH", "Aaav", a -> LeastSquares.predicted(a, true));
    entries.general(
        "FISHER", "V", a -> Coerce.of(Math.log((1 + a.number(0)) / (1 - a.number(0))) / 2));
    entries.number("FISHERINV", Math::tanh);
  }

  private static Value finite(double number) {
    return Double.isNaN(number) ? Fault.DIV0.value() : Coerce.of(number);
  }

  private static SimpleRegression line(Arguments a, int x, int y) {
    Pairs pairs = Pairs.of(a.grid(x), a.grid(y));
    SimpleRegression regression = new SimpleRegression();
    for (int i = 0; i < pairs.size(); i++) {
      regression.addData(pairs.x(i), pairs.y(i));
    }
    return regression;
  }

  private static Value covariance(Arguments a, int lost) {
    Pairs pairs = Pairs.of(a.grid(0), a.grid(1));
    int size = pairs.size();
    if (size - lost < 1) {
      throw Fault.DIV0.exception();
    }
    double meanX = java.util.Arrays.stream(pairs.xs()).average().orElseThrow();
    double meanY = java.util.Arrays.stream(pairs.ys()).average().orElseThrow();
    double sum = 0;
    for (int i = 0; i < size; i++) {
      sum += (pairs.x(i) - meanX) * (pairs.y(i) - meanY);
    }
    return Coerce.of(sum / (size - lost));
  }
}
