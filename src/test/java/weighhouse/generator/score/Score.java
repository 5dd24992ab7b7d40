package weighhouse.generator.score;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** The result of scoring a folder of audits. */
public final class Score {
  private final Tally total = new Tally();
  private final Tally queries = new Tally();
  private final Map<String, Tally> families = new TreeMap<>();
  private final Map<String, Tally> layouts = new TreeMap<>();
  private final Map<String, Tally> rules = new TreeMap<>();
  private final List<String> misses = new ArrayList<>();
  private final List<String> falseAlarms = new ArrayList<>();
  private final List<String> notAudited = new ArrayList<>();

  /** Faults of rules that are above {@code query}. */
  public Tally total() {
    return total;
  }

  /** Faults of rules that only ask. */
  public Tally queries() {
    return queries;
  }

  /** By family of rules. */
  public Map<String, Tally> families() {
    return families;
  }

  /** By layout. */
  public Map<String, Tally> layouts() {
    return layouts;
  }

  /** By rule. */
  public Map<String, Tally> rules() {
    return rules;
  }

  /** Seeded faults that were not found. */
  public List<String> misses() {
    return misses;
  }

  /** Findings that match nothing seeded. */
  public List<String> falseAlarms() {
    return falseAlarms;
  }

  /** Workbooks without an audit. */
  public List<String> notAudited() {
    return notAudited;
  }

  List<Tally> tallies(String rule, String layout) {
    Tally family = families.computeIfAbsent(RuleList.family(rule), it -> new Tally());
    Tally byRule = rules.computeIfAbsent(rule, it -> new Tally());
    return RuleList.asks(rule)
        ? List.of(queries, byRule)
        : List.of(total, family, byRule, layouts.computeIfAbsent(layout, it -> new Tally()));
  }

  /** All figures and lists as text. */
  public String text() {
    StringBuilder text = new StringBuilder();
    section(text, "", Map.of("all faults", total));
    section(text, "", Map.of("queries", queries));
    section(text, "by family", families);
    section(text, "by layout", layouts);
    section(text, "by rule", rules);
    list(text, "misses", misses);
    list(text, "false alarms", falseAlarms);
    list(text, "not audited", notAudited);
    return text.toString();
  }

  private static void section(StringBuilder text, String title, Map<String, Tally> tallies) {
    text.append(title.isEmpty() ? "" : "\n" + title + "\n");
    tallies.forEach((key, tally) -> text.append("%-42s %s%n".formatted(key, tally)));
  }

  private static void list(StringBuilder text, String title, List<String> lines) {
    text.append("%n%s (%d)%n".formatted(title, lines.size()));
    lines.forEach(line -> text.append("  ").append(line).append('\n'));
  }
}
