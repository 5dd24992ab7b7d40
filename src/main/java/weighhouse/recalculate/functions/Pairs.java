package weighhouse.recalculate.functions;

import java.util.Arrays;

/** Places where two rectangles of one size both hold a number. */
@SuppressWarnings("ArrayRecordComponent") // compared nowhere
record Pairs(double[] xs, double[] ys) {

  /** {@code #N/A} where the sizes differ. */
  static Pairs of(Grid x, Grid y) {
    if (x.size() != y.size()) {
      throw Fault.NA.exception();
    }
    double[] xs = new double[x.size()];
    double[] ys = new double[x.size()];
    int size = 0;
    for (int i = 0; i < xs.length; i++) {
      Coerce.sound(x.at(i));
      Coerce.sound(y.at(i));
      xs[size] = x.number(i / x.columns(), i % x.columns());
      ys[size] = y.number(i / y.columns(), i % y.columns());
      size += Double.isNaN(xs[size]) || Double.isNaN(ys[size]) ? 0 : 1;
    }
    return new Pairs(Arrays.copyOf(xs, size), Arrays.copyOf(ys, size));
  }

  int size() {
    return xs.length;
  }

  double x(int index) {
    return xs[index];
  }

  double y(int index) {
    return ys[index];
  }
}
