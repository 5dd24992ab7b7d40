package weighhouse.rules.file;

import java.util.List;
import java.util.Map;
import weighhouse.quantity.Kind;
import weighhouse.rules.pattern.Metavariable;
import weighhouse.rules.pattern.TypedPattern;

/**
 * What a rule file says.
 *
 * @param path where it was read, for faults
 * @param rule its id, equal to the file's name
 * @param family its folder
 * @param title one line
 * @param severity critical, major, minor or query
 * @param where its metavariables
 * @param patterns what it looks for; empty where a check does
 * @param gives the kind of what its correction gives, or null
 * @param assumes what the correction takes for granted, or null
 * @param check name of the check in place of patterns, or null
 * @param parameters what the check is told
 * @param yieldsTo rules that say the same thing better where both match; of a check, also those
 *     from whose places its own may follow
 * @param explain why it is a mistake
 * @param ask the question for the author
 * @param sources published sources
 * @param examples its tests
 * @param line where its correction, or else the rule, starts
 */
public record RuleFile(
    String path,
    String rule,
    String family,
    String title,
    String severity,
    Map<String, Metavariable> where,
    List<TypedPattern> patterns,
    Kind gives,
    String assumes,
    String check,
    Map<String, String> parameters,
    List<String> yieldsTo,
    String explain,
    String ask,
    List<CitedSource> sources,
    List<Example> examples,
    int line) {

  /** A key of the list of sources with a place in it, which may be null. */
  public record CitedSource(String key, String at) {}
}
