package weighhouse.report.html;

import weighhouse.audit.AuditResult;
import weighhouse.audit.Severity;
import weighhouse.audit.Verdict;

/** The verdict in words. */
final class VerdictWords {
  private VerdictWords() {}

  static String word(Verdict verdict) {
    return Tags.capital(verdict.text());
  }

  /** Why the verdict is as it is, in a sentence. */
  static String sentence(AuditResult result) {
    long faults = open(result, false);
    long questions = open(result, true);
    return switch (result.verdict()) {
      case HOLD ->
          Tags.count(faults, "finding") + " to settle before this model is used" + and(questions);
      case QUERY ->
          faults == 0
              ? Tags.count(questions, "question") + " for the author; no fault was found."
              : Tags.count(faults, "finding") + " of little consequence" + and(questions);
      case PASS -> "Every effect measure that could be analysed acts as it should.";
    };
  }

  private static String and(long questions) {
    return questions == 0 ? "." : ", and " + Tags.count(questions, "question") + " for the author.";
  }

  private static long open(AuditResult result, boolean queries) {
    return result.findings().stream()
        .filter(f -> f.acceptance() == null && (f.severity() == Severity.QUERY) == queries)
        .count();
  }
}
