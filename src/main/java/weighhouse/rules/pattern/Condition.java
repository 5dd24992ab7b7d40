package weighhouse.rules.pattern;

/** What must hold of a metavariable beyond its kind. */
public sealed interface Condition
    permits SpanCondition, ValueCondition, IncludesCondition, FixedCondition, PlainCondition {

  /** Whether it holds of what the metavariable stands for; false where that cannot be told. */
  boolean holds(Bound bound, Situation situation);

  /** The other metavariable it speaks of; null if none. */
  default String other() {
    return null;
  }
}
