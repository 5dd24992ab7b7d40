package weighhouse.audit;

import java.util.Locale;

/** The scale on which a measure acts in the running model. */
public enum ActsOn {
  HAZARD,
  RISK,
  ODDS,
  SURVIVAL,
  COMPLEMENT,
  TIME,
  NOTHING,
  MIXED;

  public String text() {
    return name().toLowerCase(Locale.ROOT);
  }
}
