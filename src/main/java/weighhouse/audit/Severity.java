package weighhouse.audit;

import java.util.Locale;

/** How much a finding matters, gravest first. */
public enum Severity {
  /** A probability leaves [0, 1], or the decision changes. */
  CRITICAL,
  MAJOR,
  /** The difference is below the tolerance today. */
  MINOR,
  /** A question to the author, not a fault. */
  QUERY;

  public String text() {
    return name().toLowerCase(Locale.ROOT);
  }
}
