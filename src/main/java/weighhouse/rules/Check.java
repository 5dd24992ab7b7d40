package weighhouse.rules;

import java.util.List;
import java.util.Map;

/**
 * What a rule does that no pattern can say. An implementation is listed as a service of this type,
 * has no state, and is named in a rule file: {@code check: { name: its-name, parameter: value }}.
 */
public interface Check {
  /** What starts the names of checks that only the running model can answer, elsewhere. */
  String PROBE = "probe-";

  /** The name by which rule files call it. */
  String name();

  /**
   * Looks at a workbook.
   *
   * @param subject the workbook
   * @param rule the rule that asks, for the matches
   * @param parameters as written in the rule file
   */
  List<Match> find(Subject subject, Rule rule, Map<String, String> parameters);
}
