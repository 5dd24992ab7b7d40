package weighhouse.audit.pipeline;

import java.util.List;
import java.util.function.Predicate;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Outcome;
import weighhouse.recalculate.Values;

/**
 * Which option the model favours at the threshold, read from the outcomes it shows: incremental net
 * benefit where there is one, else incremental cost and effect, else the ICER, else the arms' net
 * benefits.
 */
final class Decision {
  private final List<Outcome> outcomes;
  private final double threshold;

  Decision(List<Outcome> outcomes, double threshold) {
    this.outcomes = outcomes;
    this.threshold = threshold;
  }

  /** Whether the favoured option differs between two runs; false where the outcomes cannot tell. */
  boolean differs(Values now, Values then) {
    int before = favoured(now);
    int after = favoured(then);
    return before >= 0 && after >= 0 && before != after;
  }

  /** Number of the favoured option, or -1 where the outcomes do not tell. */
  private int favoured(Values values) {
    List<Outcome> incremental = those(o -> o.kind() == Kind.NET_BENEFIT && o.incremental());
    if (!incremental.isEmpty()) {
      return sign(values.number(incremental.get(0).cell()));
    }
    if (Double.isFinite(threshold)) {
      int byDifferences = byDifferences(values);
      return byDifferences >= 0 ? byDifferences : byIcer(values);
    }
    List<Outcome> arms = those(o -> o.kind() == Kind.NET_BENEFIT);
    return arms.size() < 2 ? -1 : largest(arms, values);
  }

  private int byDifferences(Values values) {
    List<Outcome> costs = those(o -> o.kind() == Kind.COST && o.incremental());
    List<Outcome> effects = those(o -> o.kind() == Kind.QALY && o.incremental());
    if (effects.isEmpty()) {
      effects = those(o -> o.kind() == Kind.LIFE_YEARS && o.incremental());
    }
    if (costs.size() != 1 || effects.size() != 1) {
      return -1;
    }
    return sign(
        threshold * values.number(effects.get(0).cell()) - values.number(costs.get(0).cell()));
  }

  private int byIcer(Values values) {
    List<Outcome> icers = those(o -> o.kind() == Kind.ICER);
    return icers.size() == 1 ? sign(threshold - values.number(icers.get(0).cell())) : -1;
  }

  private static int sign(double netBenefit) {
    return Double.isNaN(netBenefit) ? -1 : netBenefit >= 0 ? 1 : 0;
  }

  private static int largest(List<Outcome> arms, Values values) {
    int best = 0;
    for (int i = 1; i < arms.size(); i++) {
      if (values.number(arms.get(i).cell()) > values.number(arms.get(best).cell())) {
        best = i;
      }
    }
    return best;
  }

  private List<Outcome> those(Predicate<Outcome> wanted) {
    return outcomes.stream().filter(wanted).toList();
  }
}
