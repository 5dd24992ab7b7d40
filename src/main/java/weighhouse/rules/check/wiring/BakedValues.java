package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Line;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Pasted probabilities of one arm that are the other arm's under a ratio of the workbook. */
public final class BakedValues implements Check {
  /** Fewer numbers than this agree by chance. */
  private static final int FEWEST = 3;

  private static final int MOST_SERIES = 150;

  /** Half a unit of the last digit that pasted numbers commonly keep. */
  private static final double ROUNDING = 0.51e-4;

  @Override
  public String name() {
    return "baked-values";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Series> series = series(survey);
    List<CellAddress> ratios =
        survey.measures().stream()
            .filter(cell -> Measures.isRatio(survey.kind(cell)))
            .filter(cell -> Math.abs(survey.base().number(cell) - 1) > 0.01)
            .toList();
    List<Match> matches = new ArrayList<>();
    for (Series baked : series) {
      derived(baked, series, ratios, survey, rule).ifPresent(matches::add);
    }
    return matches;
  }

  @SuppressWarnings("ArrayRecordComponent") // compared nowhere
  private record Series(CellRange range, double[] values) {
    boolean isLike(Series other) {
      return values.length == other.values.length && !range.equals(other.range);
    }
  }

  private static List<Series> series(Survey survey) {
    return Line.of(Kind.PROBABILITY, survey).stream()
        .filter(line -> Survey.cells(line.cells()).stream().allMatch(survey::isTyped))
        .limit(MOST_SERIES)
        .map(line -> new Series(line.cells(), line.values(survey)))
        .toList();
  }

  private static Optional<Match> derived(
      Series baked, List<Series> all, List<CellAddress> ratios, Survey survey, Rule rule) {
    for (Series base : all) {
      for (CellAddress ratio : base.isLike(baked) ? ratios : List.<CellAddress>of()) {
        double r = survey.base().number(ratio);
        if (agrees(baked, base, r, false)) {
          return Optional.of(match(rule, baked, base, ratio, survey));
        } else if (agrees(baked, base, r, true)) {
          return Optional.of(match(rule.at("query"), baked, base, ratio, survey));
        }
      }
    }
    return Optional.empty();
  }

  private static boolean agrees(Series baked, Series base, double ratio, boolean onHazard) {
    int telling = 0;
    for (int i = 0; i < baked.values.length; i++) {
      double p = base.values[i];
      double product = p * ratio;
      double power = 1 - Math.pow(1 - p, ratio);
      double within = Math.min(ROUNDING, Math.max(1e-9, Math.abs(product - power) / 4));
      if (!(Math.abs(baked.values[i] - (onHazard ? power : product)) <= within)) {
        return false;
      }
      telling += Math.abs(product - p) > 4 * within ? 1 : 0;
    }
    return telling >= FEWEST;
  }

  /** What would stand there if the link were kept: the ratio on the hazard. */
  private static Match match(
      Rule rule, Series baked, Series base, CellAddress ratio, Survey survey) {
    CellAddress host = baked.range.first();
    Expr one = new Expr.Num(1, "1");
    Expr p = survey.relative(base.range.first(), host);
    Expr stay = new Expr.Binary(BinaryOp.SUBTRACT, one, p);
    Expr power = new Expr.Binary(BinaryOp.POWER, stay, survey.fixed(ratio, host));
    Expr linked = new Expr.Binary(BinaryOp.SUBTRACT, one, power);
    String note =
        "The numbers are those of %s under the ratio in %s, without a formula between them."
            .formatted(
                survey.subject().workbook().show(base.range),
                survey.subject().workbook().show(ratio));
    return Survey.match(rule, baked.range, null, linked, note);
  }
}
