package weighhouse.rules;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.ServiceLoader;

/** The checks on the class path by name. */
final class Checks {
  private final Map<String, Check> byName = new HashMap<>();

  Checks() {
    ServiceLoader.load(Check.class, Check.class.getClassLoader())
        .forEach(check -> byName.put(check.name(), check));
  }

  /** Whether there is such a check, here or in the probe. */
  boolean knows(String name) {
    return byName.containsKey(name) || name.startsWith(Check.PROBE);
  }

  List<Match> find(LoadedRule rule, Subject subject) {
    Check check = rule.file().check() == null ? null : byName.get(rule.file().check());
    return check == null ? List.of() : check.find(subject, rule.rule(), rule.file().parameters());
  }
}
