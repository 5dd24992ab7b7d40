package weighhouse.rules.pattern;

import java.util.Locale;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;

/**
 * The word {@code cycles_of_p} in a correction: the cycle's length as a part of the time that
 * operand p speaks of.
 */
public final class CyclesOf {
  private static final String PREFIX = "cycles_of_";
  private static final double WHOLE_WITHIN = 0.02;

  private CyclesOf() {}

  /** The metavariable itself, of either the word or the plain metavariable. */
  public static String metavariable(String name) {
    return name.startsWith(PREFIX) ? name.substring(PREFIX.length()) : name;
  }

  static boolean isOne(String name) {
    return name.startsWith(PREFIX);
  }

  /**
   * One part of so many where that is a whole number, such as {@code 1/12}; a plain number else.
   */
  static Expr expression(Bound bound, FormulaView view) {
    double cycle = view.scope().quantities().cycle().years();
    double span = SpanCondition.length(bound.quantities(), view.scope().quantities().cycle());
    double parts = span / cycle;
    return Math.abs(parts - Math.rint(parts)) <= WHOLE_WITHIN && parts > 1
        ? new Expr.Binary(BinaryOp.DIVIDE, number(1), number(Math.rint(parts)))
        : number(cycle / span);
  }

  private static Expr number(double value) {
    String text =
        value == Math.rint(value)
            ? String.format(Locale.ROOT, "%.0f", value)
            : String.format(Locale.ROOT, "%.10g", value);
    return new Expr.Num(Double.parseDouble(text), text);
  }
}
