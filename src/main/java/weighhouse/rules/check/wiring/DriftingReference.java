package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;

/**
 * A relative reference that is at an effect measure where the formula starts, and then slides off.
 */
public final class DriftingReference implements Check {
  @Override
  public String name() {
    return "drifting-reference";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Match> matches = new ArrayList<>();
    for (Region region : survey.regions()) {
      if (region.range().size() > 1 && !survey.shape(region).array()) {
        drift(region, survey, rule).ifPresent(matches::add);
      }
    }
    return matches;
  }

  private static Optional<Match> drift(Region region, Survey survey, Rule rule) {
    CellAddress first = region.range().first();
    Expr tree = survey.tree(region);
    for (Expr node : Trees.walk(tree)) {
      if (node instanceof Expr.CellRef reference
          && Measures.isEstimate(survey.quantity(node, first))) {
        Slide slide = new Slide(reference, region.range(), survey);
        int off = slide.firstOff();
        if (off > 0) {
          Expr mended = Trees.replace(tree, node, slide.fixed());
          return Optional.of(Survey.match(rule, slide.from(off), node, mended));
        }
      }
    }
    return Optional.empty();
  }

  /** One reference along the range that its formula fills. */
  private record Slide(Expr.CellRef reference, CellRange range, Survey survey) {

    private boolean vertical() {
      return range.rows() > 1 && !reference.row().absolute();
    }

    private int length() {
      boolean slides = vertical() || (range.columns() > 1 && !reference.column().absolute());
      return slides ? vertical() ? range.rows() : range.columns() : 0;
    }

    private CellAddress host(int step) {
      return vertical() ? range.first().offset(step, 0) : range.first().offset(0, step);
    }

    /** The first step at which the reference is off the measures; 0 if it never is. */
    int firstOff() {
      int length = length();
      for (int step = 1; step < length; step++) {
        Optional<CellAddress> target = survey.cell(reference, host(step));
        if (target.isEmpty() || !holdsMeasure(target.get())) {
          boolean list = step > 2 && step * 4 >= length; // a value for each year, a few missing
          return target.isPresent() && isElsewhere(target.get()) && !list ? step : 0;
        }
      }
      return 0;
    }

    private boolean holdsMeasure(CellAddress cell) {
      return Measures.isMeasure(survey.kind(cell)) && survey.stored(cell) != CellKind.TEXT;
    }

    private boolean isElsewhere(CellAddress cell) {
      CellKind stored = survey.stored(cell);
      boolean empty = stored == CellKind.BLANK && !survey.hasFormula(cell);
      return empty || stored == CellKind.TEXT || survey.kind(cell) != Kind.UNKNOWN;
    }

    CellRange from(int step) {
      CellAddress start = host(step);
      return new CellRange(
          range.sheet(), start.row(), start.column(), range.lastRow(), range.lastColumn());
    }

    Expr fixed() {
      CellAddress first = range.first();
      boolean one = range.rows() == 1 || range.columns() == 1;
      Axis row = new Axis(reference.row().resolve(first.row()), true);
      Axis column = new Axis(reference.column().resolve(first.column()), true);
      return new Expr.CellRef(
          reference.sheet(),
          vertical() || one ? row : reference.row(),
          !vertical() || one ? column : reference.column());
    }
  }
}
