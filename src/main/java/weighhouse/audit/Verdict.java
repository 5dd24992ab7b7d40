package weighhouse.audit;

import java.util.Locale;

/** What the audit says of the whole workbook. */
public enum Verdict {
  PASS,
  QUERY,
  HOLD;

  public String text() {
    return name().toLowerCase(Locale.ROOT);
  }
}
