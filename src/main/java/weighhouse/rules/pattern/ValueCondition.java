package weighhouse.rules.pattern;

/** The operand's present value lies beyond a limit. */
public record ValueCondition(Comparison comparison, double limit) implements Condition {
  /** How a value compares with the limit. */
  public enum Comparison {
    ABOVE,
    BELOW,
    AT_MOST,
    AT_LEAST
  }

  @Override
  public boolean holds(Bound bound, Situation situation) {
    double value = situation.values().applyAsDouble(bound.operand());
    return switch (comparison) {
      case ABOVE -> value > limit;
      case BELOW -> value < limit;
      case AT_MOST -> value <= limit;
      case AT_LEAST -> value >= limit;
    };
  }
}
