package weighhouse.rules.check.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Line;
import weighhouse.rules.check.Survey;

/** Survival from a common start that is, or with shorter steps would be, higher at a later time. */
public final class RisingSurvival implements Check {
  private static final double ROUNDING = 1e-7;

  @Override
  public String name() {
    return "rising-survival";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Match> matches = new ArrayList<>();
    for (Line line : Line.of(Kind.SURVIVAL, survey)) {
      double[] curve = line.values(survey);
      int rise = firstRise(curve);
      if (rise > 0 && isCumulative(curve) && !isCopy(line, survey)) {
        String note = "It rises first in " + subject.workbook().show(line.at(rise)) + ".";
        matches.add(Survey.match(rule, line.cells(), null, null, note));
      }
    }
    LateEffect late = new LateEffect(survey);
    for (Region region : survey.regions()) {
      boolean known = matches.stream().anyMatch(m -> m.cells().get(0).overlaps(region.range()));
      if (!known && late.isIn(survey.tree(region), region.range().first())) {
        matches.add(Survey.match(rule, region.range(), null, null));
      }
    }
    return matches;
  }

  private static int firstRise(double[] curve) {
    for (int i = 1; i < curve.length; i++) {
      if (curve[i] > curve[i - 1] + ROUNDING) {
        return i;
      }
    }
    return 0;
  }

  /** From 1 downwards nearly all the way: no survival of single intervals. */
  private static boolean isCumulative(double[] curve) {
    int falls = 0;
    for (int i = 1; i < curve.length; i++) {
      if (!(curve[i] >= 0 && curve[i] <= 1 + ROUNDING)) {
        return false;
      }
      falls += curve[i] < curve[i - 1] ? 1 : 0;
    }
    boolean fromStart = Math.abs(curve[0] - 1) < 0.1;
    return fromStart && falls * 3 >= 2 * (curve.length - 1) && curve[curve.length - 1] < curve[0];
  }

  private static boolean isCopy(Line line, Survey survey) {
    Region region = survey.subject().shapes().regionAt(line.at(line.length() - 1));
    Expr tree = region == null ? null : Trees.inside(survey.tree(region));
    return tree != null && Trees.children(tree).isEmpty();
  }
}
