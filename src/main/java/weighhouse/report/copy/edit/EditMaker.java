package weighhouse.report.copy.edit;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Figure;
import weighhouse.audit.Finding;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.report.text.Visible;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Sheet;

/**
 * From findings to the cells that change. Where two findings correct one cell, the more
 * consequential one's formula is written and the other one is told in the comment.
 */
public final class EditMaker {
  private final AuditResult result;
  private final boolean commentsOnly;
  private final TreeMap<CellAddress, String> formulas = new TreeMap<>();
  private final TreeMap<CellAddress, String> comments = new TreeMap<>();

  private EditMaker(AuditResult result, boolean commentsOnly) {
    this.result = result;
    this.commentsOnly = commentsOnly;
  }

  /**
   * The changes for an audit.
   *
   * @param only ids of the findings to correct, empty for all that are not accepted
   * @param commentsOnly whether formulas stay as they are
   * @param values recalculated values of cells after the corrections, as far as known
   */
  public static Edits make(
      AuditResult result, Set<String> only, boolean commentsOnly, Map<CellAddress, Figure> values) {
    EditMaker maker = new EditMaker(result, commentsOnly);
    List<Finding> chosen =
        result.findings().stream()
            .filter(f -> only.isEmpty() ? f.acceptance() == null : only.contains(f.id()))
            .toList();
    chosen.forEach(maker::add);
    Map<CellAddress, Figure> written = commentsOnly ? Map.of() : values;
    List<String> sheets = result.workbook().sheets().stream().map(Sheet::name).toList();
    return new Edits(
        sheets,
        maker.formulas,
        maker.comments,
        written,
        ReviewRows.of(result, chosen, maker.formulas));
  }

  private void add(Finding finding) {
    Expr corrected = tree(finding);
    for (CellRange range : finding.cells()) {
      for (int row = range.firstRow(); row <= range.lastRow(); row++) {
        for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
          add(finding, corrected, new CellAddress(range.sheet(), row, column));
        }
      }
    }
  }

  private void add(Finding finding, Expr corrected, CellAddress cell) {
    String formula =
        corrected == null ? null : FormulaPrinter.print(corrected, cell.row(), cell.column());
    boolean writes = formula != null && !commentsOnly && !formulas.containsKey(cell);
    if (writes) {
      formulas.put(cell, formula);
    }
    String comment = comment(finding, cell, formula, writes);
    comments.merge(cell, comment, (one, other) -> one + "\n\n" + other);
  }

  private String comment(Finding finding, CellAddress cell, String formula, boolean written) {
    StringBuilder text = new StringBuilder();
    text.append(Visible.text(finding.message()));
    if (formula != null) {
      text.append(written ? "\nWas: " + present(cell) : "\nSuggested: =" + formula);
    } else if (finding.question() != null && !finding.question().isBlank()) {
      text.append('\n').append(Visible.text(finding.question()));
    }
    return text.append("\n(")
        .append(finding.rule().id())
        .append(", ")
        .append(finding.id())
        .append(')')
        .toString();
  }

  /** What the cell holds now. */
  private String present(CellAddress cell) {
    CellStore cells = result.workbook().sheet(cell.sheet()).cells();
    int index = cells.find(cell.row(), cell.column());
    if (index < 0) {
      return "empty";
    }
    String formula = cells.formula(index);
    if (formula == null) {
      String text = cells.text(index);
      return text != null ? Visible.text(text) : Double.toString(cells.number(index));
    }
    Expr tree = parsed(formula, cells.anchorRow(index), cells.anchorColumn(index));
    return tree == null
        ? "=" + Visible.text(formula)
        : "=" + Visible.text(FormulaPrinter.print(tree, cell.row(), cell.column()));
  }

  private static Expr tree(Finding finding) {
    return finding.suggestedFormula() == null
        ? null
        : parsed(finding.suggestedFormula(), finding.host().row(), finding.host().column());
  }

  private static Expr parsed(String formula, int row, int column) {
    try {
      return FormulaParser.parse(formula, row, column).tree();
    } catch (FormulaSyntaxException e) {
      return null;
    }
  }
}
