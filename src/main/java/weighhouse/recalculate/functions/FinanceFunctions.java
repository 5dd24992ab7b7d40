package weighhouse.recalculate.functions;

import java.util.function.DoubleUnaryOperator;
import weighhouse.recalculate.Value;

/** Present and future values, payments, rates of return. Money paid is negative. */
final class FinanceFunctions {
  private static final int ROUNDS = 200;

  private FinanceFunctions() {}

  static void enter(Entries entries) {
    entries.general("NPV", "VR+", a -> Coerce.of(npv(a.number(0), Numbers.of(a, 1))));
    entries.general("PV", "VVVvv", a -> Coerce.of(pv(a)));
    entries.general("FV", "VVVvv", a -> Coerce.of(fv(a, a.number(3, 0))));
    entries.general("PMT", "VVVvv", a -> Coerce.of(payment(a)));
    entries.general("NPER", "VVVvv", a -> Coerce.of(periods(a)));
    entries.general("RATE", "VVVvvv", FinanceFunctions::rate);
    entries.general("IRR", "Rv", a -> irr(Numbers.in(a, 0), a.number(1, 0.1)));
    entries.general("EFFECT", "VV", a -> Coerce.of(effective(a.number(0), a.integer(1))));
    entries.general("NOMINAL", "VV", a -> Coerce.of(nominal(a.number(0), a.integer(1))));
    entries.general("RRI", "VVV", a -> Coerce.of(growth(a)));
    entries.general("XNPV", "VRR", a -> Coerce.of(dated(a, 0, 1, 2)));
  }

  private static double npv(double rate, double[] flows) {
    double sum = 0;
    for (int i = 0; i < flows.length; i++) {
      sum += flows[i] / Math.pow(1 + rate, i + 1);
    }
    return sum;
  }

  /** What one payment in each period comes to at the end. */
  private static double annuity(double rate, double periods, double due) {
    if (rate == 0) {
      return periods;
    }
    double factor = Math.expm1(periods * Math.log1p(rate)) / rate;
    return due != 0 ? factor * (1 + rate) : factor;
  }

  private static double pv(Arguments a) {
    double rate = a.number(0);
    double factor = Math.pow(1 + rate, a.number(1));
    return -(a.number(3, 0) + a.number(2) * annuity(rate, a.number(1), a.number(4, 0))) / factor;
  }

  private static double fv(Arguments a, double present) {
    double rate = a.number(0);
    double factor = Math.pow(1 + rate, a.number(1));
    return -(present * factor + a.number(2, 0) * annuity(rate, a.number(1), a.number(4, 0)));
  }

  private static double payment(Arguments a) {
    double rate = a.number(0);
    double factor = Math.pow(1 + rate, a.number(1));
    return -(a.number(2) * factor + a.number(3, 0)) / annuity(rate, a.number(1), a.number(4, 0));
  }

  private static double periods(Arguments a) {
    double rate = a.number(0);
    double payment = a.number(1);
    double present = a.number(2);
    double future = a.number(3, 0);
    if (rate == 0) {
      return -(present + future) / payment;
    }
    double paid = a.number(4, 0) != 0 ? payment * (1 + rate) / rate : payment / rate;
    return Math.log((paid - future) / (paid + present)) / Math.log1p(rate);
  }

  private static Value rate(Arguments a) {
    DoubleUnaryOperator balance =
        rate ->
            a.number(2) * Math.pow(1 + rate, a.number(0))
                + a.number(1) * annuity(rate, a.number(0), a.number(4, 0))
                + a.number(3, 0);
    return root(balance, a.number(5, 0.1));
  }

  private static Value irr(double[] flows, double guess) {
    return root(rate -> npv(rate, flows), guess);
  }

  /** By secants from the guess, then by halving wherever the sign changes. */
  private static Value root(DoubleUnaryOperator function, double guess) {
    double x0 = guess;
    double x1 = guess == 0 ? 1e-3 : guess * 1.01;
    double f0 = function.applyAsDouble(x0);
    for (int i = 0; i < ROUNDS; i++) {
      double f1 = function.applyAsDouble(x1);
      if (Math.abs(x1 - x0) < 1e-14 * Math.max(1, Math.abs(x1)) || f1 == 0) {
        return Coerce.of(x1);
      }
      double next = x1 - f1 * (x1 - x0) / (f1 - f0);
      if (!(next > -1) || !Double.isFinite(next)) {
        return halved(function);
      }
      x0 = x1;
      f0 = f1;
      x1 = next;
    }
    return halved(function);
  }

  private static Value halved(DoubleUnaryOperator function) {
    double low = -0.999999;
    for (double high = -0.99; high < 1000; high = high < 1 ? high + 0.01 : high * 1.1) {
      if (function.applyAsDouble(low) * function.applyAsDouble(high) <= 0) {
        return Coerce.of(halved(function, low, high));
      }
      low = high;
    }
    return Fault.NUM.value();
  }

  private static double halved(DoubleUnaryOperator function, double from, double to) {
    double low = from;
    double high = to;
    for (int i = 0; i < ROUNDS && high - low > 1e-15; i++) {
      double middle = (low + high) / 2;
      if (function.applyAsDouble(low) * function.applyAsDouble(middle) <= 0) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return (low + high) / 2;
  }

  private static double effective(double nominal, int periods) {
    return nominal <= 0 || periods < 1
        ? Double.NaN
        : Math.expm1(periods * Math.log1p(nominal / periods));
  }

  private static double nominal(double effective, int periods) {
    return effective <= 0 || periods < 1
        ? Double.NaN
        : periods * Math.expm1(Math.log1p(effective) / periods);
  }

  private static double growth(Arguments a) {
    return Math.pow(a.number(2) / a.number(1), 1 / a.number(0)) - 1;
  }

  private static double dated(Arguments a, int rate, int flows, int dates) {
    double[] amounts = Numbers.in(a, flows);
    double[] days = Numbers.in(a, dates);
    if (amounts.length != days.length) {
      throw Fault.NUM.exception();
    }
    double sum = 0;
    for (int i = 0; i < amounts.length; i++) {
      sum += amounts[i] / Math.pow(1 + a.number(rate), (days[i] - days[0]) / 365);
    }
    return sum;
  }
}
