package weighhouse.rules.pattern;

import java.util.Set;
import weighhouse.quantity.Kind;

/** One at least of the factors taken together is of these kinds. */
public record IncludesCondition(Set<Kind> kinds) implements Condition {
  @Override
  public boolean holds(Bound bound, Situation situation) {
    return bound.quantities().stream().anyMatch(quantity -> kinds.contains(quantity.kind()));
  }
}
