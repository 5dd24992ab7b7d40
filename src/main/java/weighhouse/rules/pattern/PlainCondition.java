package weighhouse.rules.pattern;

import weighhouse.formula.Trees;

/** The operand is one reference or name, not a calculation. */
public record PlainCondition() implements Condition {
  @Override
  public boolean holds(Bound bound, Situation situation) {
    return Trees.children(bound.operand()).isEmpty();
  }
}
