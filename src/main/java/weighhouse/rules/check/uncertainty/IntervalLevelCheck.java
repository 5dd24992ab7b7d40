package weighhouse.rules.check.uncertainty;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import weighhouse.effect.StandardNormal;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Estimates;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.IntervalLevel;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.NearbyTexts;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.rules.check.ratio.Width;
import weighhouse.workbook.CellAddress;

/** A multiplier of the standard error that does not belong to the interval it is used with. */
public final class IntervalLevelCheck implements Check {
  @Override
  public String name() {
    return "interval-level";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    return new Search(new ModelView(subject), rule).all();
  }

  private static final class Search {
    /** 4 for 3.92 is a rounding of habit. */
    private static final double SAME_WITHIN = 0.03;

    private static final double[] LEVELS = {0.80, 0.90, 0.95, 0.98, 0.99};

    private final ModelView model;
    private final Rule rule;
    private final Estimates estimates;
    private final IntervalLevel levels;
    private final List<Match> matches = new ArrayList<>();

    Search(ModelView model, Rule rule) {
      this.model = model;
      this.rule = rule;
      this.estimates = new Estimates(model);
      this.levels = new IntervalLevel(new NearbyTexts(model.subject().workbook()));
    }

    List<Match> all() {
      for (Place place : model.places(Search::divides)) {
        for (Expr node : Trees.walk(place.tree())) {
          Width.of(node, place.host(), model, estimates).ifPresent(width -> width(place, width));
        }
      }
      Set<Place> limits = new LinkedHashSet<>();
      estimates.limits().forEach(cell -> model.place(cell).ifPresent(limits::add));
      limits.forEach(this::limit);
      return matches;
    }

    private static boolean divides(Expr tree) {
      return Trees.contains(tree, n -> n instanceof Expr.Binary b && b.op() == BinaryOp.DIVIDE);
    }

    private void width(Place place, Width width) {
      int sides = width.whole() ? 2 : 1;
      Optional<Double> told =
          levels.of(
              Stream.of(width.high(), width.low())
                  .map(figure -> model.cell(figure, place.host()))
                  .filter(cell -> cell != null && estimates.limit(cell).isPresent())
                  .toList());
      if (told.isPresent()) {
        double expected = sides * StandardNormal.multiplier(told.get());
        if (!near(width.divisor(), expected)) {
          widthMatch(place, width, expected, "The labels speak of " + percent(told.get()) + ".");
        }
      } else if (isOfOtherSides(width.divisor(), sides)) {
        double expected = width.whole() ? 2 * width.divisor() : width.divisor() / 2;
        widthMatch(
            place,
            width,
            expected,
            width.whole()
                ? "From limit to limit an interval is two multipliers wide."
                : "From the ratio to a limit an interval is one multiplier wide.");
      }
    }

    /** 1.96 over a whole interval, or 3.92 over half of one. */
    private static boolean isOfOtherSides(double divisor, int sides) {
      return sides == 2
          ? near(divisor, StandardNormal.multiplier(0.95))
              || near(divisor, StandardNormal.multiplier(0.90))
          : near(divisor, 2 * StandardNormal.multiplier(0.95))
              || near(divisor, 2 * StandardNormal.multiplier(0.90));
    }

    private void widthMatch(Place place, Width width, double expected, String note) {
      matches.add(
          Found.at(rule, place)
              .replacing(place.tree(), width.node(), width.dividedBy(digits(expected)))
              .with("u", width.high())
              .with("l", width.low())
              .saying(note)
              .match());
    }

    /** {@code EXP(LN(R) - 1.96 * se)} in the cell of a limit. */
    private void limit(Place place) {
      Optional<Double> told = levels.of(List.of(place.host()));
      if (told.isEmpty()) {
        return;
      }
      double expected = StandardNormal.multiplier(told.get());
      for (Expr node : Trees.walk(place.tree())) {
        double written = multiplier(node, place.host());
        if (!Double.isNaN(written) && !near(written, expected)) {
          matches.add(
              Found.at(rule, place)
                  .replacing(place.tree(), node, Refs.number(digits(expected)))
                  .saying("The labels speak of " + percent(told.get()) + ".")
                  .match());
          return;
        }
      }
    }

    /** The node's value where it is a multiplier of some usual level; NaN of all else. */
    private double multiplier(Expr node, CellAddress host) {
      boolean number = node instanceof Expr.Num;
      boolean quantile =
          node instanceof Expr.Call call
              && (call.function().equals("NORM.S.INV") || call.function().equals("NORMSINV"))
              && Parts.isConstant(node);
      double value = number || quantile ? Math.abs(model.value(node, host)) : Double.NaN;
      for (double level : LEVELS) {
        if (Math.abs(value / StandardNormal.multiplier(level) - 1) < 0.005) {
          return value;
        }
      }
      return Double.NaN;
    }

    private static boolean near(double a, double b) {
      return Math.abs(a / b - 1) < SAME_WITHIN;
    }

    private static String digits(double multiplier) {
      BigDecimal rounded = BigDecimal.valueOf(multiplier).setScale(3, RoundingMode.HALF_UP);
      return rounded.stripTrailingZeros().toPlainString();
    }

    private static String percent(double level) {
      return Math.round(level * 100) + " %";
    }
  }
}
