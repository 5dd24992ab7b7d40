package weighhouse.rules;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Trees;
import weighhouse.quantity.Quantities;
import weighhouse.rules.pattern.Found;
import weighhouse.rules.pattern.ModelScope;
import weighhouse.workbook.CellAddress;

/**
 * Which arms a ratio's label compares: "HR usual care versus drug" used for the drug is rightly
 * turned round.
 */
final class ComparedArms {
  private static final Pattern VERSUS =
      Pattern.compile(
          "(.+?)\\b(?:versus|vs\\.?|compared (?:with|to)|gegen|gegenüber|contra|frente a|contre|par rapport à|comparado con|im vergleich zu)\\s+(.+)",
          Pattern.CASE_INSENSITIVE);

  /** The one rule to which the direction of a comparison matters. */
  private static final String RECIPROCALS = "ratio-inverted";

  private ComparedArms() {}

  /**
   * Whether the formula takes a reciprocal and a ratio in it speaks of the other arm against the
   * one that the host's label names.
   */
  static boolean reversed(
      Rule rule, Found found, CellAddress host, Quantities quantities, ModelScope scope) {
    if (!rule.id().equals(RECIPROCALS)) {
      return false;
    }
    ReferenceResolver references = new ReferenceResolver(scope.workbook());
    String arm = quantities.label(host).toLowerCase(Locale.ROOT);
    return found.operands().values().stream()
        .map((Expr operand) -> references.cell(Trees.inside(operand), host))
        .flatMap(cell -> cell.stream())
        .anyMatch(cell -> isAgainst(quantities.label(cell), arm));
  }

  private static boolean isAgainst(String ratio, String arm) {
    Matcher versus = VERSUS.matcher(ratio.toLowerCase(Locale.ROOT));
    if (!versus.matches()) {
      return false;
    }
    String second = versus.group(2).split("[,;:(]", 2)[0].strip();
    return !second.isEmpty() && arm.contains(second) && !namesFirst(versus.group(1), arm);
  }

  /** Whether the label's last words name the arm before "versus". */
  private static boolean namesFirst(String before, String arm) {
    String[] words = before.strip().split("\\s+", -1);
    String last = words[words.length - 1];
    String pair = words.length > 1 ? words[words.length - 2] + " " + last : last;
    return arm.endsWith(pair);
  }
}
