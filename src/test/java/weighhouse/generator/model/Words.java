package weighhouse.generator.model;

import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** What the workbook's cells say, in its language. */
public final class Words {
  private static final List<String> LANGUAGES = List.of("en", "es", "de", "fr");
  private static final Map<String, List<String>> TABLE =
      Tables.rows("words").stream().collect(Collectors.toMap(row -> row.get(0), row -> row));

  private final String language;
  private final int column;
  private final String comparator;
  private final String treatment;

  /** Words of a language for a comparison. */
  public Words(String language, String comparator, String treatment) {
    this.language = language;
    this.column = 1 + LANGUAGES.indexOf(language);
    this.comparator = comparator;
    this.treatment = treatment;
  }

  /** The text of a key; the key itself where the table has none. */
  public String of(String key) {
    List<String> row = TABLE.get(key);
    return row == null ? key : row.get(column);
  }

  /** The text of a key about something. */
  public String of(String key, String about) {
    return of(key).replace("%s", about);
  }

  /** A label for a measure of an event. */
  public String measure(Measure measure, String key, String about, Dice dice) {
    List<String> labels =
        Tables.rows("measures").stream()
            .filter(row -> row.get(0).equals(measure.name()) && row.get(1).equals(language))
            .map(row -> row.get(2))
            .toList();
    return dice.pick(labels)
        .replace("%s", about)
        .replace("%k", key)
        .replace("%a", treatment)
        .replace("%c", comparator);
  }

  /** Two letters. */
  public String language() {
    return language;
  }

  /** Name of arm 0 or 1. */
  public String arm(int arm) {
    return arm == 0 ? comparator : treatment;
  }

  /** Both arms. */
  public String versus() {
    return treatment + " vs " + comparator;
  }
}
