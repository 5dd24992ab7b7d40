package weighhouse.rules.check.uncertainty;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Estimate;
import weighhouse.rules.check.ratio.Estimates;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;

/** A ratio varied by so many per cent up and down although its interval is in the workbook. */
public final class ArbitraryRangeCheck implements Check {
  private static final double MIRRORED_WITHIN = 1e-6;

  @Override
  public String name() {
    return "ratio-range-beside-interval";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    Map<CellAddress, Estimate> intervals = intervals(model);
    List<Match> matches = new ArrayList<>();
    if (!intervals.isEmpty()) {
      for (List<Moved> both : pairs(model).values()) {
        Estimate interval = intervals.get(both.get(0).ratio());
        if (interval != null && mirrored(both)) {
          matches.add(match(rule, both.get(0), interval, subject));
        }
      }
    }
    return matches;
  }

  /** Ratios with limits that are no share of the ratio themselves. */
  private static Map<CellAddress, Estimate> intervals(ModelView model) {
    Map<CellAddress, Estimate> intervals = new HashMap<>();
    for (Estimate estimate : new Estimates(model).all()) {
      boolean range =
          moved(estimate.lower(), model).isPresent() || moved(estimate.upper(), model).isPresent();
      if (!range) {
        intervals.put(estimate.cell(), estimate);
      }
    }
    return intervals;
  }

  /** A cell that moves a ratio by a share. */
  private record Moved(Place place, CellAddress ratio, double factor) {}

  private static Map<CellAddress, List<Moved>> pairs(ModelView model) {
    Map<CellAddress, List<Moved>> byRatio = new LinkedHashMap<>();
    for (Place place : model.places(tree -> isProduct(tree))) {
      RangeFactor.of(Trees.inside(place.tree()), place.host(), model)
          .map(f -> new Moved(place, model.cell(f.ratio(), place.host()), f.factor()))
          .ifPresent(
              moved -> byRatio.computeIfAbsent(moved.ratio(), r -> new ArrayList<>()).add(moved));
    }
    return byRatio;
  }

  private static boolean isProduct(Expr tree) {
    return Trees.inside(tree) instanceof Expr.Binary binary && binary.op() == BinaryOp.MULTIPLY;
  }

  private static Optional<RangeFactor> moved(CellAddress limit, ModelView model) {
    Expr formula = model.formula(limit);
    return formula == null ? Optional.empty() : RangeFactor.of(Trees.inside(formula), limit, model);
  }

  private static boolean mirrored(List<Moved> both) {
    return both.stream()
        .anyMatch(
            a ->
                both.stream()
                    .anyMatch(b -> Math.abs(a.factor() + b.factor() - 2) < MIRRORED_WITHIN));
  }

  private static Match match(Rule rule, Moved moved, Estimate interval, Subject subject) {
    CellAddress host = moved.place().host();
    Expr limit =
        Refs.to(moved.factor() < 1 ? interval.lower() : interval.upper(), host, subject.workbook());
    return Found.at(rule, moved.place())
        .replacing(moved.place().tree(), moved.place().tree(), limit)
        .with("r", Refs.to(moved.ratio(), host, subject.workbook()))
        .match();
  }
}
