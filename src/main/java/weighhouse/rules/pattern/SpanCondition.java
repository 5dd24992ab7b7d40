package weighhouse.rules.pattern;

import weighhouse.quantity.Cycle;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Span;

/** How the time that an operand speaks of compares with the cycle or with another operand's. */
public record SpanCondition(Relation relation, String other) implements Condition {
  /** The model's cycle in place of a metavariable. */
  public static final String CYCLE = "cycle";

  private static final double SAME_WITHIN = 0.01;

  /** How two lengths of time compare. */
  public enum Relation {
    SAME_AS,
    DIFFERS_FROM,
    LONGER_THAN,
    SHORTER_THAN
  }

  @Override
  public boolean holds(Bound bound, Situation situation) {
    Quantities quantities = situation.view().scope().quantities();
    double own = length(bound.quantities(), quantities.cycle());
    double theirs =
        other.equals(CYCLE)
            ? quantities.cycle().years()
            : length(situation.bounds().get(other).quantities(), quantities.cycle());
    return holds(own / theirs);
  }

  private boolean holds(double times) {
    boolean same = Math.abs(times - 1) <= SAME_WITHIN;
    return switch (relation) {
      case SAME_AS -> same;
      case DIFFERS_FROM -> !Double.isNaN(times) && !same;
      case LONGER_THAN -> times > 1 && !same;
      case SHORTER_THAN -> times < 1 && !same;
    };
  }

  static double length(Iterable<Quantity> quantities, Cycle cycle) {
    for (Quantity quantity : quantities) {
      if (quantity.span() != null) {
        return years(quantity.span(), cycle);
      }
    }
    return Double.NaN;
  }

  /** Years of a span; NaN of one in cycles where the cycle's length is unknown. */
  static double years(Span span, Cycle cycle) {
    double years = span.years();
    return Double.isNaN(years) ? span.amount() * cycle.years() : years;
  }
}
