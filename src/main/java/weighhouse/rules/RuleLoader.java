package weighhouse.rules;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.rules.file.Fault;
import weighhouse.rules.file.RuleFile;
import weighhouse.rules.file.RuleFileReader;
import weighhouse.rules.file.SourceList;

/** Reads all rule files and holds them against each other. */
final class RuleLoader {
  private final Checks checks = new Checks();
  private final List<Fault> faults = new ArrayList<>();
  private final Map<String, LoadedRule> rules = new LinkedHashMap<>();

  private RuleLoader() {}

  static RuleBook load(List<Path> folders) {
    RuleLoader loader = new RuleLoader();
    SourceList sources = SourceList.read(RuleFolders.sources(), "rules/sources.yaml");
    loader.faults.addAll(sources.faults());
    RuleFileReader reader = new RuleFileReader(sources.sources().keySet());
    loader.read(RuleFolders.shipped(), reader);
    for (Path folder : folders) {
      loader.read(RuleFolders.under(folder), reader);
    }
    loader.checkReferences();
    if (!loader.faults.isEmpty()) {
      throw new RuleFaultsException(loader.faults);
    }
    return new RuleBook(List.copyOf(loader.rules.values()), sources.sources(), loader.checks);
  }

  private void read(List<RuleFolders.Text> texts, RuleFileReader reader) {
    for (RuleFolders.Text text : texts) {
      RuleFileReader.Result result =
          reader.read(text.text(), text.family(), text.name(), text.path());
      faults.addAll(result.faults());
      result.file().ifPresent(file -> rules.put(file.rule(), LoadedRule.of(file)));
    }
  }

  private void checkReferences() {
    Set<String> known = new HashSet<>(rules.keySet());
    for (LoadedRule rule : rules.values()) {
      RuleFile file = rule.file();
      for (String other : file.yieldsTo()) {
        if (!known.contains(other)) {
          faults.add(fault(file, "yields to '" + other + "', which is no rule"));
        }
      }
      if (file.check() != null && !checks.knows(file.check())) {
        faults.add(fault(file, "check '" + file.check() + "' does not exist"));
      }
    }
  }

  private static Fault fault(RuleFile file, String message) {
    return new Fault(file.path(), 1, 1, message);
  }
}
