package weighhouse.rules;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.rules.file.RuleFile;
import weighhouse.rules.file.SourceList;

/** All rules, shipped and the house's own. Safe for use by several threads. */
public final class RuleBook {
  private final Map<String, LoadedRule> rules;
  private final Map<String, SourceList.Entry> sources;
  private final Checks checks;

  RuleBook(List<LoadedRule> rules, Map<String, SourceList.Entry> sources, Checks checks) {
    this.rules = new LinkedHashMap<>();
    rules.forEach(rule -> this.rules.put(rule.rule().id(), rule));
    this.sources = Map.copyOf(sources);
    this.checks = checks;
  }

  /** A published source; doi may be null. */
  public record Source(String citation, String doi) {}

  /** The rules that come with the program. */
  public static RuleBook shipped() {
    return load(List.of());
  }

  /** The shipped rules and those in the given folders. */
  public static RuleBook load(Path... folders) {
    return load(Arrays.asList(folders));
  }

  /**
   * The shipped rules and those in the given folders; a house's rule takes the place of a shipped
   * one of the same name.
   *
   * @throws RuleFaultsException with every fault of every file
   */
  public static RuleBook load(List<Path> folders) {
    return RuleLoader.load(folders);
  }

  /** All rules, by family and name as the files lie. */
  public List<Rule> rules() {
    return rules.values().stream().map(LoadedRule::rule).toList();
  }

  public Optional<Rule> rule(String id) {
    return Optional.ofNullable(rules.get(id)).map(LoadedRule::rule);
  }

  /** What the rule's file says, for documentation and tests. */
  public Optional<RuleFile> file(String id) {
    return Optional.ofNullable(rules.get(id)).map(LoadedRule::file);
  }

  /** A source that a rule cites. */
  public Source source(String key) {
    SourceList.Entry entry = sources.get(key);
    if (entry == null) {
      throw new IllegalArgumentException("no source '" + key + "'");
    }
    return new Source(entry.citation(), entry.doi());
  }

  /** Every place of the workbook where a rule applies, by rule and then by place. */
  public List<Match> match(Subject subject) {
    List<Match> matches = new ArrayList<>();
    matches.addAll(new RegionMatcher(List.copyOf(rules.values()), subject).match());
    for (LoadedRule rule : rules.values()) {
      matches.addAll(checks.find(rule, subject));
    }
    return new Consequences(rules, subject).leaveOut(matches);
  }
}
