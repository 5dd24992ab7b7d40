package weighhouse.generator.score;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import weighhouse.generator.model.Tables;

/** Rules, their families, and which ids name the same mistake. */
public final class RuleList {
  private static final Map<String, List<String>> RULES =
      Tables.rows("rules").stream().collect(Collectors.toMap(row -> row.get(1), row -> row));
  private static final Set<String> EQUIVALENTS =
      Tables.rows("equivalents").stream()
          .map(row -> row.get(0) + " " + row.get(1))
          .collect(Collectors.toSet());

  private RuleList() {}

  /** All ids. */
  public static Set<String> ids() {
    return RULES.keySet();
  }

  /** Family of a rule, {@code other} where it is none of ours. */
  public static String family(String rule) {
    return RULES.containsKey(rule) ? RULES.get(rule).get(0) : "other";
  }

  /** Whether the rule only asks the author. */
  public static boolean asks(String rule) {
    return RULES.containsKey(rule) && RULES.get(rule).get(2).equals("query");
  }

  /** Whether a finding's rule names the seeded mistake. */
  public static boolean names(String found, String seeded) {
    return found.equals(seeded) || EQUIVALENTS.contains(seeded + " " + found);
  }
}
