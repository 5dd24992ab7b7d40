package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Captions;
import weighhouse.rules.check.Line;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Modelled probabilities of death that are lower than those of the life table beside them. */
public final class BelowBackground implements Check {
  private static final double ROUNDING = 1e-9;

  @Override
  public String name() {
    return "below-background";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Captions captions = new Captions(survey);
    List<Line> lines = Line.of(Kind.PROBABILITY, survey);
    List<Line> tables =
        lines.stream().filter(line -> BackgroundWords.areIn(line.caption(captions))).toList();
    List<Match> matches = new ArrayList<>();
    for (Line line : tables.isEmpty() ? List.<Line>of() : lines) {
      if (BackgroundWords.nameDeath(line.caption(captions))) {
        tables.stream()
            .filter(line::isBeside)
            .filter(table -> !areAdded(line, table, survey))
            .findFirst()
            .ifPresent(table -> compare(line, table, survey, rule, matches));
      }
    }
    return matches;
  }

  private static void compare(
      Line line, Line table, Survey survey, Rule rule, List<Match> matches) {
    double[] modelled = line.values(survey);
    double[] background = table.values(survey);
    for (int i = 0; i < modelled.length; i++) {
      if (modelled[i] < background[i] - ROUNDING) {
        matches.add(match(line, table, line.at(i), survey, rule));
        return;
      }
    }
  }

  private static Match match(Line line, Line table, CellAddress first, Survey survey, Rule rule) {
    Region region = survey.subject().shapes().regionAt(line.cells().first());
    String note =
        "Lower than "
            + survey.subject().workbook().show(table.cells())
            + " first in "
            + survey.subject().workbook().show(first)
            + ".";
    if (region == null) {
      return Survey.match(rule, line.cells(), null, null, note);
    }
    CellAddress host = region.range().first();
    Expr beside = survey.relative(table.cells().first(), line.cells().first());
    Expr larger = new Expr.Call("MAX", List.of(survey.tree(region), beside));
    boolean aligned = host.equals(line.cells().first());
    return Survey.match(rule, region.range(), null, aligned ? larger : null, note);
  }

  /** Whether some formula takes both, so that the modelled deaths come on top. */
  private static boolean areAdded(Line line, Line table, Survey survey) {
    CellAddress a = line.cells().first();
    CellAddress b = table.cells().first();
    for (Region region : survey.regions()) {
      List<CellRange> read =
          survey.references().ranges(survey.tree(region), region.range().first());
      if (read.stream().anyMatch(r -> near(r, a)) && read.stream().anyMatch(r -> near(r, b))) {
        return true;
      }
    }
    return false;
  }

  /** The formulas of a trace may read the cycle before the first one. */
  private static boolean near(CellRange range, CellAddress cell) {
    return range.contains(cell) || range.contains(cell.offset(1, 0));
  }
}
