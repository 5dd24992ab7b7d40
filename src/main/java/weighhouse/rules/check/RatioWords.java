package weighhouse.rules.check;

import java.util.regex.Pattern;

/** Whether a label names a ratio outright, for cells of which no number tells anything. */
public final class RatioWords {
  private static final Pattern WORDS =
      Pattern.compile(
          "\\b(?:HR|RR|IRR|SMR|OR)\\b(?!\\s*[a-z])"
              + "|(?i)\\b(?:hazard|rate|risk|odds|mortality|incidence)[ -]ratio\\b"
              + "|(?i)\\brelative (?:risk|effect|hazard)\\b");

  private RatioWords() {}

  /** Whether the label speaks of a hazard, rate, risk, odds or mortality ratio. */
  public static boolean in(String label) {
    return WORDS.matcher(label).find();
  }
}
