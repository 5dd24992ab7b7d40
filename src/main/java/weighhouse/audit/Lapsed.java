package weighhouse.audit;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** Acceptances of a brief that no longer count. */
public final class Lapsed {
  private Lapsed() {}

  /**
   * One sentence for each acceptance that has expired or whose finding is no longer there.
   *
   * @param ids ids of all findings of the audit
   * @param today the day of the audit
   */
  public static List<String> of(Brief brief, List<String> ids, LocalDate today) {
    Set<String> found = ids.stream().collect(Collectors.toSet());
    List<String> sentences = new ArrayList<>();
    for (Brief.Accepted accepted : brief.accepted()) {
      if (!found.contains(accepted.finding())) {
        sentences.add(
            "The accepted finding "
                + accepted.finding()
                + " is no longer there; take it from the brief.");
      } else if (accepted.until() != null && accepted.until().isBefore(today)) {
        sentences.add(
            "The acceptance of "
                + accepted.finding()
                + " ended on "
                + accepted.until()
                + "; settle it or accept it anew.");
      }
    }
    return sentences;
  }
}
