package weighhouse.rules.check.uncertainty;

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
import weighhouse.rules.check.ratio.Draw;
import weighhouse.rules.check.ratio.Draws;
import weighhouse.rules.check.ratio.Estimates;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.Logarithms;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Ratios;
import weighhouse.rules.check.ratio.Width;
import weighhouse.workbook.CellAddress;

/** The width of an interval between the limits themselves, used as the error of the logarithm. */
public final class NaturalErrorCheck implements Check {
  private static final int DEEPEST = 4;

  @Override
  public String name() {
    return "natural-interval-for-log-error";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    return new Search(new ModelView(subject), rule).all();
  }

  private static final class Search {
    private final ModelView model;
    private final Rule rule;
    private final Estimates estimates;
    private final Logarithms logarithms;
    private final Map<CellAddress, Match> matches = new LinkedHashMap<>();

    Search(ModelView model, Rule rule) {
      this.model = model;
      this.rule = rule;
      this.estimates = new Estimates(model);
      this.logarithms = new Logarithms(model);
    }

    List<Match> all() {
      Draws draws = new Draws(model);
      for (Place place : model.places(Draws::mayDraw)) {
        for (Draw draw : draws.in(place)) {
          if (isOnLogScale(draw, place.host())) {
            trace(draw.spread(), place, 0);
          }
        }
        scaledExponents(place);
      }
      labelled();
      return List.copyOf(matches.values());
    }

    /** Its mean is a logarithm, or it is log-normal and not one mistake already. */
    private boolean isOnLogScale(Draw draw, CellAddress host) {
      boolean ratio = Ratios.isRatio(model.quantity(draw.location(), host));
      return logarithms.isLog(draw.location(), host) || (draw.logNormal() && !ratio);
    }

    /** {@code ratio * EXP(se * z)}. */
    private void scaledExponents(Place place) {
      for (Expr node : Trees.walk(place.tree())) {
        boolean exponent =
            node instanceof Expr.Call call
                && call.function().equals("EXP")
                && call.arguments().size() == 1
                && Parts.is(call.arguments().get(0), BinaryOp.MULTIPLY);
        if (exponent) {
          Parts.factors(Parts.argument(node, 0)).forEach(factor -> trace(factor, place, 0));
        }
      }
    }

    /** Standard errors that say they are the logarithm's. */
    private void labelled() {
      LogSpread spreads = new LogSpread(model);
      for (Place place : model.placesOf(Ratios::isStandardError)) {
        if (spreads.saysLog(place.host())) {
          trace(place.tree(), place, 0);
        }
      }
    }

    /** Follows a standard error to the formula that makes it. */
    private void trace(Expr spread, Place place, int depth) {
      for (Expr result : Parts.results(spread)) {
        Optional<Width> width = Width.of(result, place.host(), model, estimates);
        CellAddress cell = model.cell(result, place.host());
        if (width.isPresent() && !width.get().logs()) {
          matches.computeIfAbsent(place.host(), host -> match(place, width.get()));
        } else if (cell != null && depth < DEEPEST) {
          model.place(cell).ifPresent(next -> trace(next.tree(), next, depth + 1));
        }
      }
    }

    private Match match(Place place, Width width) {
      return Found.at(rule, place)
          .replacing(place.tree(), width.node(), width.onLogScale())
          .with("u", width.high())
          .with("l", width.low())
          .match();
    }
  }
}
