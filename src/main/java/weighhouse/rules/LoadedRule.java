package weighhouse.rules;

import java.util.List;
import weighhouse.rules.file.RuleFile;
import weighhouse.rules.pattern.TypedPattern;

/** A rule as people read it with the file it came from. */
record LoadedRule(Rule rule, RuleFile file) {

  static LoadedRule of(RuleFile file) {
    List<Rule.Citation> sources =
        file.sources().stream().map(s -> new Rule.Citation(s.key(), s.at())).toList();
    Rule rule =
        new Rule(
            file.rule(),
            file.family(),
            file.title(),
            file.severity(),
            file.explain(),
            file.ask(),
            sources);
    return new LoadedRule(rule, file);
  }

  /** The rule with the severity of one of its patterns. */
  Rule withLevelOf(TypedPattern pattern) {
    return pattern.level() == null ? rule : rule.at(pattern.level());
  }

  boolean yieldsTo(LoadedRule other) {
    return file.yieldsTo().contains(other.rule.id());
  }
}
