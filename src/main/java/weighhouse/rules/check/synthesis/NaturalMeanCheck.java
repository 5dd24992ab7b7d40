package weighhouse.rules.check.synthesis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Ratios;

/** The plain or weighted mean of several ratios. */
public final class NaturalMeanCheck implements Check {
  @Override
  public String name() {
    return "mean-of-ratios";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    MeanForms forms = new MeanForms(model);
    List<Match> matches = new ArrayList<>();
    for (Place place : model.places(MeanForms::mayBeMean)) {
      for (Expr node : Trees.walk(place.tree())) {
        Optional<MeanForms.Mean> mean = forms.of(node, place.host());
        if (mean.isPresent() && isRatio(place, node, model)) {
          matches.add(match(rule, place, node, mean.get()));
          break;
        }
      }
    }
    return matches;
  }

  /** A mean inside a larger formula is judged by its operands, a whole cell by its label too. */
  private static boolean isRatio(Place place, Expr node, ModelView model) {
    boolean whole = Trees.inside(place.tree()).equals(node);
    return !whole
        || Ratios.isRatio(model.quantity(place.host()))
        || model.quantity(place.host()).equals(weighhouse.quantity.Quantity.UNKNOWN);
  }

  private static Match match(Rule rule, Place place, Expr node, MeanForms.Mean mean) {
    Rule levelled = mean.ofPatients() ? Found.as("query", rule) : rule;
    Found found =
        Found.at(levelled, place)
            .replacing(place.tree(), node, mean.onLogScale())
            .with("r", mean.ratios());
    if (mean.ofPatients()) {
      found.saying("The weights may be shares of patients rather than of information.");
    }
    return found.match();
  }
}
