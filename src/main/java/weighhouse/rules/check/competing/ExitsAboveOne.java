package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.recalculate.Change;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.Values;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;

/**
 * Exits of a state that take more than all of it, now or at the upper limit of an effect measure.
 */
public final class ExitsAboveOne implements Check {
  private static final double ROUNDING = 1e-9;

  /** Cells of one region that are looked at. */
  private static final int SAMPLE = 2000;

  private static final int SAMPLE_AT_LIMITS = 5;
  private static final int MOST_LIMITS = 40;
  private static final int REACH = 8;

  @Override
  public String name() {
    return "exits-above-one";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Limit> limits = limits(survey);
    List<Match> matches = new ArrayList<>();
    for (Region region : survey.regions()) {
      CellAddress host = region.range().first();
      for (Remainder remainder : Remainder.in(survey.tree(region), host, survey)) {
        String note = note(region, remainder, limits, survey);
        if (note != null) {
          matches.add(Survey.match(rule, region.range(), remainder.node(), null, note));
        }
      }
    }
    return matches;
  }

  private static String note(
      Region region, Remainder remainder, List<Limit> limits, Survey survey) {
    String now = firstBelowZero(region, remainder, survey.base(), SAMPLE, survey);
    if (now != null) {
      return "The exits take more than all who are there, first in " + now + ".";
    }
    for (Limit limit : limits) {
      String then = firstBelowZero(region, remainder, limit.values(), SAMPLE_AT_LIMITS, survey);
      if (then != null) {
        String measure = survey.subject().workbook().show(limit.measure());
        return "With " + measure + " at its limit the exits take more than all in " + then + ".";
      }
    }
    return null;
  }

  private static String firstBelowZero(
      Region region, Remainder remainder, Values values, int sample, Survey survey) {
    boolean whole = Trees.inside(survey.tree(region)).equals(remainder.node());
    Expr node = remainder.node();
    ToDoubleFunction<CellAddress> stay =
        whole
            ? values::number
            : cell -> survey.subject().recalculation().evaluate(node, cell, values).number();
    return Survey.spread(region.range(), whole ? sample : Math.min(sample, 50)).stream()
        .filter(cell -> stay.applyAsDouble(cell) < -ROUNDING)
        .findFirst()
        .map(survey.subject().workbook()::show)
        .orElse(null);
  }

  /** The model with one measure at its limit away from 1. */
  private record Limit(CellAddress measure, Values values) {}

  private static List<Limit> limits(Survey survey) {
    List<Limit> limits = new ArrayList<>();
    for (CellAddress cell : survey.measures()) {
      if (limits.size() < MOST_LIMITS
          && survey.isTyped(cell)
          && Measures.isRatio(survey.kind(cell))) {
        double upper = upper(cell, survey);
        if (upper > Math.max(1, survey.base().number(cell))) {
          Change change = new Change(Map.of(cell, new Value.Num(upper)), Map.of());
          limits.add(new Limit(cell, survey.subject().recalculation().whatIf(change)));
        }
      }
    }
    return limits;
  }

  private static double upper(CellAddress measure, Survey survey) {
    for (int step = 1; step <= REACH; step++) {
      CellAddress near = measure.offset(0, step);
      Quantity quantity = survey.subject().quantities().at(near);
      if (quantity.role() == Role.UPPER_LIMIT && quantity.kind() == survey.kind(measure)) {
        return survey.base().number(near);
      }
    }
    return Double.NaN;
  }
}
