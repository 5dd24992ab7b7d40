package weighhouse.audit;

import java.util.List;
import weighhouse.formula.SourceSpan;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * One finding, rooted where the mistake is made (not at the cells that copy it).
 *
 * @param id stable across runs and unrelated edits
 * @param rule the rule that found it
 * @param severity by consequence
 * @param certainty how sure
 * @param cells the root regions
 * @param host the first cell, for which {@code formula} and {@code suggestedFormula} are written
 * @param formula as Excel shows it with its equals sign; the typed value where no formula stands
 * @param offending the part of {@code formula} that is wrong, or null for the whole
 * @param suggestedFormula corrected formula at the first cell, or null
 * @param values at least the first, last and worst cell
 * @param outcomes this correction alone
 * @param decisionFlips whether this correction alone changes the decision at the threshold
 * @param silent whether the fault makes no difference at present inputs
 * @param message one sentence for the reviewer
 * @param explanation why, in two sentences or so
 * @param question for the author
 * @param operands the references of the formula with their labels, for people
 * @param path cells from the measure's input to the result, in order of flow; may be empty
 * @param notes further remarks (assumptions, loss of certainty and why)
 * @param acceptance the reviewer's acceptance, or null
 */
public record Finding(
    String id,
    RuleText rule,
    Severity severity,
    Certainty certainty,
    List<CellRange> cells,
    CellAddress host,
    String formula,
    SourceSpan offending,
    String suggestedFormula,
    List<CellFigures> values,
    List<OutcomeFigures> outcomes,
    boolean decisionFlips,
    boolean silent,
    String message,
    String explanation,
    String question,
    List<Operand> operands,
    List<CellAddress> path,
    List<String> notes,
    Acceptance acceptance) {

  /** What a report tells of the rule. */
  public record RuleText(String id, String family, String title, List<Source> sources) {}

  /** A published source; locator and doi may be null. */
  public record Source(String key, String citation, String locator, String doi) {}

  /** A reference in the formula with its label and quantity in words. */
  public record Operand(String reference, String label, String quantity, Figure value) {}

  /** The reviewer's acceptance; {@code until} an ISO date or null. */
  public record Acceptance(String reason, String by, String until) {}
}
