package weighhouse.audit.pipeline;

import java.util.List;
import weighhouse.rules.RuleBook;
import weighhouse.rules.file.RuleFile;
import weighhouse.workbook.CellRange;

/** Leaves out what another finding at the same cells says better, as the rule files tell. */
final class Yielding {
  private Yielding() {}

  static List<Suspect> settle(List<Suspect> suspects, RuleBook rules) {
    return suspects.stream()
        .filter(s -> suspects.stream().noneMatch(other -> yields(s, other, rules)))
        .toList();
  }

  private static boolean yields(Suspect suspect, Suspect other, RuleBook rules) {
    List<String> better = rules.file(suspect.rule().id()).map(RuleFile::yieldsTo).orElse(List.of());
    return better.contains(other.rule().id()) && overlap(suspect, other);
  }

  private static boolean overlap(Suspect a, Suspect b) {
    List<CellRange> cells = b.cells();
    return a.cells().stream().anyMatch(range -> cells.stream().anyMatch(range::overlaps));
  }
}
