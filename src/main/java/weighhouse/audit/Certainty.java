package weighhouse.audit;

import java.util.Locale;

/** How sure a finding is. */
public enum Certainty {
  /** Reading and recomputation agree. */
  PROVEN,
  LIKELY,
  POSSIBLE;

  public String text() {
    return name().toLowerCase(Locale.ROOT);
  }
}
