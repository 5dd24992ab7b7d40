package weighhouse.rules;

import java.util.List;

/**
 * What a rule file says for people; its patterns and checks stay inside this package.
 *
 * @param id file name without its ending
 * @param family its folder
 * @param title one line
 * @param level severity as written in the file: critical, major, minor or query
 * @param explain why it is a mistake, plain text
 * @param ask the question for the author, may hold {@code {metavariable}}
 * @param sources published sources by key with an optional locator
 */
public record Rule(
    String id,
    String family,
    String title,
    String level,
    String explain,
    String ask,
    List<Citation> sources) {

  /** A source by its key in {@code rules/sources.yaml}; {@code at} may be null. */
  public record Citation(String key, String at) {}

  /** The same rule at another severity. */
  public Rule at(String otherLevel) {
    return new Rule(id, family, title, otherLevel, explain, ask, sources);
  }
}
