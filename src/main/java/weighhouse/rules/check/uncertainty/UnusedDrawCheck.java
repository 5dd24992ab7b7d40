package weighhouse.rules.check.uncertainty;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Role;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Draw;
import weighhouse.rules.check.ratio.Draws;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Ratios;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** A drawn ratio on which nothing of the model depends while other draws are used. */
public final class UnusedDrawCheck implements Check {
  /** A longer column of draws is a store of results, not an input. */
  private static final int MOST_DRAWS = 50;

  private static final Set<Kind> MODELLED =
      EnumSet.of(
          Kind.PROBABILITY,
          Kind.RATE,
          Kind.CUMULATIVE_HAZARD,
          Kind.SURVIVAL,
          Kind.ODDS,
          Kind.OCCUPANCY,
          Kind.SURVIVAL_TIME,
          Kind.COST,
          Kind.UTILITY,
          Kind.LIFE_YEARS,
          Kind.QALY,
          Kind.ICER,
          Kind.NET_BENEFIT);

  @Override
  public String name() {
    return "unused-draw";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    Draws draws = new Draws(model);
    List<Place> unused = new ArrayList<>();
    boolean used = false;
    for (Place place : model.places(Draws::mayDraw)) {
      List<Draw> own = draws.in(place);
      if (!own.isEmpty() && place.range().size() <= MOST_DRAWS) {
        boolean reaches = reaches(place, model);
        used |= reaches;
        if (!reaches && isRatio(place, own, model)) {
          unused.add(place);
        }
      }
    }
    // Where no draw is used, a macro or a data table may carry them over.
    boolean carried = !used && !subject.workbook().macros().isEmpty();
    return carried ? List.of() : unused.stream().map(p -> match(rule, p, subject)).toList();
  }

  private static boolean isRatio(Place place, List<Draw> draws, ModelView model) {
    return draws.stream()
        .anyMatch(
            draw ->
                Ratios.isRatio(model.quantity(place.host()))
                    || Ratios.isRatio(model.quantity(draw.node(), place.host())));
  }

  /** Whether some quantity of the model depends on any of the cells. */
  private static boolean reaches(Place place, ModelView model) {
    CellRange range = place.range();
    for (int row = range.firstRow(); row <= range.lastRow(); row++) {
      for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
        if (reaches(new CellAddress(range.sheet(), row, column), model)) {
          return true;
        }
      }
    }
    return false;
  }

  private static boolean reaches(CellAddress cell, ModelView model) {
    return model.subject().recalculation().dependents(Set.of(cell)).stream()
        .anyMatch(
            range ->
                MODELLED.contains(model.quantity(range.first()).kind())
                    || MODELLED.contains(model.quantity(range.last()).kind())
                    || isLive(range.first(), model));
  }

  /** A ratio that something else than the draw itself decides on, such as a live value. */
  private static boolean isLive(CellAddress cell, ModelView model) {
    return Ratios.isRatio(model.quantity(cell))
        && model.quantity(cell).role() == Role.ESTIMATE
        && !model.subject().recalculation().dependents(Set.of(cell)).isEmpty();
  }

  private static Match match(Rule rule, Place place, Subject subject) {
    return Found.at(rule, place)
        .with("r", Refs.to(place.host(), place.host(), subject.workbook()))
        .match();
  }
}
