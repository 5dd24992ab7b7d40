package weighhouse.audit.pipeline;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.Map;
import java.util.stream.Collectors;
import weighhouse.formula.Expr;
import weighhouse.quantity.Quantities;
import weighhouse.rules.Match;
import weighhouse.rules.Subject;

/**
 * Ids that survive inserted rows, renamed sheets and unrelated edits: they rest on the rule, the
 * form of the formula and the labels around, never on addresses. Alike mistakes are told apart by
 * their order.
 */
final class FindingIds {
  private static final int DIGITS = 10;

  private final Subject subject;
  private final Map<String, Integer> seen = new HashMap<>();

  FindingIds(Subject subject) {
    this.subject = subject;
  }

  String next(Suspect suspect) {
    Match match = suspect.first();
    String key =
        suspect.rule().id()
            + '|'
            + subject.quantities().label(match.host())
            + '|'
            + form(match)
            + '|'
            + operandLabels(match);
    String id = digest(key);
    int count = seen.merge(id, 1, Integer::sum);
    return count == 1 ? id : id + "-" + count;
  }

  /** The formula with every reference blanked: what stays when rows are inserted. */
  private String form(Match match) {
    var shape = subject.shapes().at(match.host());
    return shape == null ? "" : FormulaForm.of(shape.tree());
  }

  private String operandLabels(Match match) {
    Quantities quantities = subject.quantities();
    return match.operands().entrySet().stream()
        .sorted(Map.Entry.comparingByKey())
        .map(entry -> entry.getKey() + "=" + label(quantities, entry.getValue(), match))
        .collect(Collectors.joining(";"));
  }

  private String label(Quantities quantities, Expr operand, Match match) {
    return Operands.cellOf(subject, operand, match.host()).map(quantities::label).orElse("");
  }

  private static String digest(String key) {
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256").digest(key.getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(hash).substring(0, DIGITS);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
