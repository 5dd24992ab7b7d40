package weighhouse.audit;

import java.nio.file.Path;
import java.util.List;

/**
 * What an audit works with besides the workbook.
 *
 * @param houseRules folders of rules beside the shipped ones
 * @param brief what the reviewer declares, accepts and demands
 * @param draws how many probabilistic draws to run, 0 for none
 * @param seed seed of the draws
 */
public record AuditOptions(List<Path> houseRules, Brief brief, int draws, long seed) {
  public AuditOptions {
    houseRules = List.copyOf(houseRules);
  }

  /** The shipped rules, no brief, no draws. */
  public static final AuditOptions DEFAULT = new AuditOptions(List.of(), Brief.NONE, 0, 1);
}
