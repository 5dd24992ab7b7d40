package weighhouse.audit.brief;

import java.util.List;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Finding;
import weighhouse.audit.OutcomeFigures;
import weighhouse.audit.QuantityRow;

/** Writes the brief of what an audit inferred, for the reviewer to correct. */
public final class BriefDraft {
  private static final int MOST_EVIDENCE = 160;

  private final AuditResult result;
  private final StringBuilder out = new StringBuilder();

  private BriefDraft(AuditResult result) {
    this.result = result;
  }

  /** The text of the file; {@link BriefReader} reads it. */
  public static String of(AuditResult result) {
    BriefDraft draft = new BriefDraft(result);
    draft.head();
    draft.outcomes();
    draft.quantities();
    draft.accepted();
    draft.gate();
    return draft.out.toString();
  }

  private void head() {
    line(
        "# Drafted from what the workbook tells. Correct what is wrong, delete what you do not care");
    line("# about: what stands here outranks what is inferred. Fields: docs/brief.md");
    line("workbook: " + quoted(result.workbook().fileName()));
    field("cycle", result.cycle() == null ? null : cycle(result.cycle()), "1 month");
    boolean known = !Double.isNaN(result.threshold());
    field("threshold", known ? number(result.threshold()) : null, "20000");
    line("tolerance: 0.001  # relative difference below which a finding is minor");
  }

  /** The cycle in words, where they are a length of time. */
  private static String cycle(String words) {
    try {
      QuantityText.span(words);
      return words;
    } catch (IllegalArgumentException e) {
      return null;
    }
  }

  private void field(String name, String value, String example) {
    line(
        value == null
            ? "# " + name + ": " + example + "  # not told by the workbook"
            : name + ": " + value);
  }

  private void outcomes() {
    line("");
    line("outcomes:" + (result.outcomes().isEmpty() ? " []  # none was found" : ""));
    for (OutcomeFigures outcome : result.outcomes()) {
      line("  - " + quoted(result.workbook().show(outcome.cell())) + comment(outcome.label()));
    }
  }

  private void quantities() {
    line("");
    line("quantities:" + (result.quantities().isEmpty() ? " {}" : ""));
    for (QuantityRow row : result.quantities()) {
      String evidence = String.join("; ", row.evidence());
      String text = text(row);
      boolean readable = readable(text);
      line(
          (readable ? "  " : "  # ")
              + quoted(result.workbook().show(row.range()))
              + ": "
              + text
              + comment(row.basis() + ": " + evidence));
    }
  }

  private static String text(QuantityRow row) {
    if (row.span() == null) {
      return row.kind();
    }
    return row.kind() + (row.kind().equals("rate") ? " per " : " over ") + row.span();
  }

  private static boolean readable(String text) {
    try {
      QuantityText.parse(text);
      return true;
    } catch (IllegalArgumentException e) {
      return false;
    }
  }

  private void accepted() {
    line("");
    line("accepted: []");
    List<Finding> findings = result.findings();
    for (Finding finding : findings.subList(0, Math.min(findings.size(), 200))) {
      line("#  - finding: " + quoted(finding.id()) + comment(finding.message()));
      line("#    reason: ");
      line("#    by: ");
      line("#    until: 2027-12-31");
    }
  }

  private void gate() {
    line("");
    line("gate:");
    line("  hold-at: major");
    line("  least-coverage: 0.95");
    line("  least-reproduction: 0.99");
  }

  private static String comment(String raw) {
    StringBuilder text = new StringBuilder();
    raw.codePoints()
        .map(c -> Character.isISOControl(c) || Character.getType(c) == Character.FORMAT ? ' ' : c)
        .map(c -> c == 0x2028 || c == 0x2029 ? ' ' : c)
        .limit(MOST_EVIDENCE)
        .forEach(text::appendCodePoint);
    return text.toString().isBlank() ? "" : "  # " + text.toString().strip();
  }

  /** In double quotes, where every character can be written. */
  private static String quoted(String raw) {
    StringBuilder text = new StringBuilder("\"");
    for (int i = 0; i < raw.length(); i++) {
      char c = raw.charAt(i);
      if (c == '"' || c == '\\') {
        text.append('\\').append(c);
      } else if (c < ' '
          || (c >= 0x7f && c < 0xa0)
          || Character.getType(c) == Character.FORMAT
          || c == 0x2028
          || c == 0x2029
          || Character.isSurrogate(c)) {
        text.append(String.format(java.util.Locale.ROOT, "\\u%04X", (int) c));
      } else {
        text.append(c);
      }
    }
    return text.append('"').toString();
  }

  private static String number(double number) {
    return number == Math.rint(number) ? Long.toString((long) number) : Double.toString(number);
  }

  private void line(String text) {
    out.append(text).append('\n');
  }
}
