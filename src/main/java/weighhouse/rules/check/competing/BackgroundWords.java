package weighhouse.rules.check.competing;

import java.util.regex.Pattern;

/** How workbooks call the mortality that everyone has. */
final class BackgroundWords {
  private static final Pattern BACKGROUND =
      Pattern.compile(
          "(?i)background|general[- ]population|population mortality|natural mortality|life ?table"
              + "|other[- ]causes?\\b|non[- ]disease");
  private static final Pattern ALL_CAUSES =
      Pattern.compile("(?i)all[- ]causes?\\b|overall|total|any cause|\\bOS\\b|death|mortality");
  private static final Pattern DEATH = Pattern.compile("(?i)death|mortality|\\bdie|dying|\\bqx\\b");
  private static final Pattern ONE_CAUSE =
      Pattern.compile("(?i)excess|specific|disease|cancer|cardiac|attributable|due to|relative");

  private BackgroundWords() {}

  static boolean areIn(String label) {
    return BACKGROUND.matcher(label).find();
  }

  /** Whether the label speaks of all deaths or of mortality as such. */
  static boolean nameAllCauses(String label) {
    return ALL_CAUSES.matcher(label).find();
  }

  /** Whether the label speaks of death from whatever cause. */
  static boolean nameDeath(String label) {
    return DEATH.matcher(label).find() && !ONE_CAUSE.matcher(label).find() && !areIn(label);
  }
}
