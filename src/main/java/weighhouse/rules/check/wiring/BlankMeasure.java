package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Captions;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.RatioWords;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;

/** A formula that reads an effect measure from a cell that is empty or holds text. */
public final class BlankMeasure implements Check {
  @Override
  public String name() {
    return "blank-measure";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Captions captions = new Captions(survey);
    List<Match> matches = new ArrayList<>();
    for (Region region : survey.regions()) {
      CellAddress host = region.range().first();
      for (Factors.Site site : Factors.ofEvents(survey.tree(region), host, survey)) {
        CellAddress cell = survey.cell(site.factor(), host).orElse(null);
        if (cell != null
            && isEmptyOrText(cell, survey)
            && staysPut(site.factor(), region)
            && isMeasure(cell, survey, captions)
            && !isAsked(survey.tree(region), site.factor())) {
          matches.add(Survey.match(rule, region.range(), site.factor(), null, note(cell, survey)));
          break;
        }
      }
    }
    return matches;
  }

  private static boolean isEmptyOrText(CellAddress cell, Survey survey) {
    CellKind stored = survey.stored(cell);
    return !survey.hasFormula(cell) && (stored == CellKind.BLANK || stored == CellKind.TEXT);
  }

  private static boolean isMeasure(CellAddress cell, Survey survey, Captions captions) {
    return Measures.isMeasure(survey.kind(cell)) || RatioWords.in(captions.of(cell));
  }

  /** A reference that slides along is judged where it slides off. */
  private static boolean staysPut(Expr reference, Region region) {
    return region.range().size() == 1
        || !(Trees.inside(reference) instanceof Expr.CellRef cell)
        || ((cell.row().absolute() || region.range().rows() == 1)
            && (cell.column().absolute() || region.range().columns() == 1));
  }

  /** Whether the formula asks itself whether the cell holds something. */
  private static boolean isAsked(Expr tree, Expr reference) {
    return Trees.contains(
        tree,
        node ->
            node instanceof Expr.Call call
                && call.function().startsWith("I")
                && !call.arguments().isEmpty()
                && Trees.contains(call.arguments().get(0), reference::equals)
                && !call.function().equals("IFERROR"));
  }

  private static String note(CellAddress cell, Survey survey) {
    String shown = survey.subject().workbook().show(cell);
    return survey.stored(cell) == CellKind.TEXT
        ? shown + " holds text, which arithmetic reads as a number or as an error."
        : shown + " is empty, which arithmetic reads as 0.";
  }
}
