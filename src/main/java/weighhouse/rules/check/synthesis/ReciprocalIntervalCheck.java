package weighhouse.rules.check.synthesis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.quantity.Role;
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

/** A limit of a ratio turned round that is still called the same limit. */
public final class ReciprocalIntervalCheck implements Check {
  @Override
  public String name() {
    return "reciprocal-interval";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    Estimates estimates = new Estimates(model);
    List<Match> matches = new ArrayList<>();
    for (CellAddress limit : estimates.limits()) {
      Optional<Place> place = model.place(limit).filter(p -> p.host().equals(limit));
      if (place.isPresent()) {
        Optional<Role> role = estimates.limit(limit);
        Reciprocal.of(limit, model)
            .filter(r -> estimates.limit(r.cell()).equals(role))
            .map(r -> match(rule, place.get(), r, estimates, model))
            .ifPresent(matches::add);
      }
    }
    return matches;
  }

  private static Match match(
      Rule rule, Place place, Reciprocal reciprocal, Estimates estimates, ModelView model) {
    Found found = Found.at(rule, place).marking(reciprocal.node()).with("l", reciprocal.of());
    Optional<Estimate> original = estimates.ofLimit(reciprocal.cell());
    if (original.isPresent()) {
      Estimate estimate = original.get();
      boolean lower = estimate.lower().equals(reciprocal.cell());
      CellAddress other = lower ? estimate.upper() : estimate.lower();
      found.replacing(
          place.tree(),
          reciprocal.node(),
          Refs.over(
              Refs.number("1"),
              Refs.to(other, place.host(), model.subject().workbook(), reciprocal.of())));
    }
    return found.match();
  }
}
