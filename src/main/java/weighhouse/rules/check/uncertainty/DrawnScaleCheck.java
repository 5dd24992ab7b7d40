package weighhouse.rules.check.uncertainty;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Draw;
import weighhouse.rules.check.ratio.Draws;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.Logarithms;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Ratios;
import weighhouse.rules.check.ratio.Refs;

/**
 * Draws whose mean is a ratio where its logarithm should stand. Parameter {@code distribution}:
 * {@code normal} or {@code log-normal}.
 */
public final class DrawnScaleCheck implements Check {
  @Override
  public String name() {
    return "ratio-drawn-on-natural-scale";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    boolean logNormal = "log-normal".equals(parameters.get("distribution"));
    ModelView model = new ModelView(subject);
    Draws draws = new Draws(model);
    LogSpread spreads = new LogSpread(model);
    Logarithms logarithms = new Logarithms(model);
    List<Match> matches = new ArrayList<>();
    for (Place place : model.places(Draws::mayDraw)) {
      for (Draw draw : draws.in(place)) {
        boolean ratio =
            Ratios.isRatio(model.quantity(draw.location(), place.host()))
                && !logarithms.isLog(draw.location(), place.host());
        if (draw.logNormal() == logNormal && ratio) {
          matches.add(match(rule, place, draw, spreads));
        }
      }
    }
    return matches;
  }

  private static Match match(Rule rule, Place place, Draw draw, LogSpread spreads) {
    LogSpread.Spread spread = spreads.of(draw, place.host());
    return Found.at(rule, place)
        .replacing(
            place.tree(),
            draw.node(),
            draw.logNormal(Refs.ln(draw.location()), spread.expression()))
        .with("r", draw.location())
        .with("se", draw.spread())
        .saying(spread.assumption())
        .match();
  }
}
