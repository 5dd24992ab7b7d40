package weighhouse.rules.pattern;

import java.util.List;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;

/**
 * A letter of a pattern with what it may stand for.
 *
 * @param name letters only, so that it never reads as a cell
 * @param kinds kinds of quantity
 * @param numbers numbers written into the formula, or their reciprocals
 * @param joins whether it takes all such factors of a product together
 * @param conditions what else must hold
 */
public record Metavariable(
    String name, Set<Kind> kinds, List<Double> numbers, boolean joins, List<Condition> conditions) {
  private static final double WRITTEN_TO = 1e-4;

  public Metavariable {
    kinds = Set.copyOf(kinds);
    numbers = List.copyOf(numbers);
    conditions = List.copyOf(conditions);
  }

  boolean takes(Quantity quantity) {
    return kinds.contains(quantity.kind()) && quantity.role() != Role.STANDARD_ERROR;
  }

  /** Whether a number as written is one of ours; reciprocals are written to some digits only. */
  boolean takes(double written) {
    return numbers.stream().anyMatch(n -> near(written, n) || (n != 1 && near(written * n, 1)));
  }

  private static boolean near(double a, double b) {
    return Math.abs(a - b) <= WRITTEN_TO * b;
  }
}
