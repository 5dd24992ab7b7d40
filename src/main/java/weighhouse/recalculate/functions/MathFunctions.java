package weighhouse.recalculate.functions;

import org.apache.commons.math3.special.Gamma;
import org.apache.commons.math3.util.ArithmeticUtils;
import org.apache.commons.math3.util.CombinatoricsUtils;
import weighhouse.recalculate.Value;

/** Elementary functions of one or two numbers. */
final class MathFunctions {
  private MathFunctions() {}

  static void enter(Entries entries) {
    exponentials(entries);
    trigonometry(entries);
    integers(entries);
    entries.number("ABS", Math::abs);
    entries.number("SIGN", Math::signum);
    entries.number("SQRT", Math::sqrt);
    entries.number("SQRTPI", x -> Math.sqrt(x * Math.PI));
    entries.numbers("POWER", Powers::of);
    entries.general("PI", "", a -> new Value.Num(Math.PI));
    entries.number("DEGREES", Math::toDegrees);
    entries.number("RADIANS", Math::toRadians);
  }

  private static void exponentials(Entries entries) {
    entries.number("EXP", Math::exp);
    entries.number("LN", x -> x > 0 ? Math.log(x) : Double.NaN);
    entries.number("LOG10", x -> x > 0 ? Math.log10(x) : Double.NaN);
    entries.general("LOG", "Vv", a -> logarithm(a.number(0), a.number(1, 10)));
  }

  private static Value logarithm(double number, double base) {
    if (number <= 0 || base <= 0) {
      throw Fault.NUM.exception();
    }
    if (base == 1) {
      throw Fault.DIV0.exception();
    }
    return Coerce.of(base == 10 ? Math.log10(number) : Math.log(number) / Math.log(base));
  }

  private static void trigonometry(Entries entries) {
    entries.number("SIN", Math::sin);
    entries.number("COS", Math::cos);
    entries.number("TAN", Math::tan);
    entries.number("ASIN", Math::asin);
    entries.number("ACOS", Math::acos);
    entries.number("ATAN", Math::atan);
    entries.number("SINH", Math::sinh);
    entries.number("COSH", Math::cosh);
    entries.number("TANH", Math::tanh);
    entries.number("ASINH", x -> Math.copySign(Math.log(Math.abs(x) + Math.hypot(x, 1)), x));
    entries.number("ACOSH", x -> Math.log(x + Math.sqrt(x * x - 1)));
    entries.number("ATANH", x -> (Math.log1p(x) - Math.log1p(-x)) / 2);
    entries.general("ATAN2", "VV", a -> atan2(a.number(0), a.number(1)));
  }

  private static Value atan2(double x, double y) {
    if (x == 0 && y == 0) {
      throw Fault.DIV0.exception();
    }
    return Coerce.of(Math.atan2(y, x));
  }

  private static void integers(Entries entries) {
    entries.number("FACT", x -> x < 0 || x >= 171 ? Double.NaN : factorial((int) x));
    entries.number("FACTDOUBLE", MathFunctions::doubleFactorial);
    entries.numbers("COMBIN", (n, k) -> combinations(Math.floor(n), Math.floor(k)));
    entries.numbers(
        "COMBINA", (n, k) -> combinations(Math.floor(n) + Math.floor(k) - 1, Math.floor(k)));
    entries.numbers(
        "PERMUT",
        (n, k) ->
            k < 0 || n < k
                ? Double.NaN
                : Math.rint(Math.exp(logFactorial(n) - logFactorial(n - k))));
    entries.general("GCD", "R+", a -> wholes(a, ArithmeticUtils::gcd, 0));
    entries.general("LCM", "R+", a -> wholes(a, ArithmeticUtils::lcm, 1));
  }

  private static double factorial(int n) {
    return n <= 20 ? CombinatoricsUtils.factorial(n) : CombinatoricsUtils.factorialDouble(n);
  }

  private static double logFactorial(double n) {
    return Gamma.logGamma(Math.floor(n) + 1);
  }

  private static double doubleFactorial(double x) {
    double product = 1;
    for (double n = Math.floor(x); n > 1 && product < Double.POSITIVE_INFINITY; n -= 2) {
      product *= n;
    }
    return x < -1 ? Double.NaN : product;
  }

  private static double combinations(double n, double k) {
    if (n < 0 || k < 0 || k > n || n > Integer.MAX_VALUE) {
      return Double.NaN;
    }
    return n < 1030
        ? CombinatoricsUtils.binomialCoefficientDouble((int) n, (int) k)
        : Math.exp(CombinatoricsUtils.binomialCoefficientLog((int) n, (int) k));
  }

  private interface LongOperator {
    long of(long a, long b);
  }

  private static Value wholes(Arguments a, LongOperator operator, long start) {
    long folded = start;
    for (double number : Numbers.of(a, 0)) {
      if (number < 0 || number > 1L << 53) {
        throw Fault.NUM.exception();
      }
      folded = operator.of(folded, (long) number);
    }
    return Coerce.of((double) folded);
  }
}
