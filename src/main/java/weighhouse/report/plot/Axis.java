package weighhouse.report.plot;

import java.util.ArrayList;
import java.util.List;

/**
 * Maps numbers to positions along one side of a drawing.
 *
 * @param low smallest number on the axis
 * @param high largest number, above {@code low}
 * @param from position of {@code low}
 * @param to position of {@code high}
 * @param logarithmic whether equal ratios take equal room; then {@code low} is above 0
 */
record Axis(double low, double high, double from, double to, boolean logarithmic) {
  private static final double[] STEPS = {1, 2, 5};

  /** A linear axis over the numbers, widened to round ends; a single number gets some room. */
  static Axis linear(double least, double most, double from, double to) {
    double room = most > least ? 0 : Math.max(Math.abs(least) * 0.1, 1e-9);
    double step = step(most + room - (least - room), 4);
    double low = Math.floor((least - room) / step + 1e-9) * step;
    double high = Math.ceil((most + room) / step - 1e-9) * step;
    return new Axis(low, high, from, to, false);
  }

  double at(double number) {
    double share =
        logarithmic
            ? (Math.log(number) - Math.log(low)) / (Math.log(high) - Math.log(low))
            : (number - low) / (high - low);
    return from + share * (to - from);
  }

  /** Round numbers on the axis, about as many as asked for. */
  List<Double> ticks(int about) {
    return logarithmic ? roundRatios() : multiples(step(high - low, about));
  }

  private List<Double> multiples(double step) {
    List<Double> ticks = new ArrayList<>();
    for (long i = (long) Math.ceil(low / step - 1e-9); i * step <= high + step * 1e-9; i++) {
      ticks.add(i * step);
    }
    return ticks;
  }

  /** Numbers such as 0.2, 0.5, 1, 2; tenths where the axis spans less than a doubling. */
  private List<Double> roundRatios() {
    if (high / low < 3) {
      return multiples(step(high - low, 4));
    }
    List<Double> ticks = new ArrayList<>();
    for (int power = (int) Math.floor(Math.log10(low)); Math.pow(10, power) <= high; power++) {
      for (double step : STEPS) {
        double tick = step * Math.pow(10, power);
        if (tick >= low * (1 - 1e-9) && tick <= high * (1 + 1e-9)) {
          ticks.add(tick);
        }
      }
    }
    return ticks;
  }

  private static double step(double length, int about) {
    double raw = length / about;
    double power = Math.pow(10, Math.floor(Math.log10(raw)));
    for (double step : STEPS) {
      if (raw <= step * power * (1 + 1e-9)) {
        return step * power;
      }
    }
    return 10 * power;
  }
}
