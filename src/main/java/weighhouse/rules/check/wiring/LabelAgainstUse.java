package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.quantity.Basis;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellRange;

/**
 * An effect measure, or a declared cell, that is called one thing and used as another. Probabilities
 * that are called rates are left to the rules on conversions.
 */
public final class LabelAgainstUse implements Check {
  @Override
  public String name() {
    return "label-against-use";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    List<Match> matches = new ArrayList<>();
    if (!subject.quantities().healthEconomic()) {
      return matches;
    }
    for (CellRange range : subject.quantities().ranges()) {
      Inferred inferred = subject.quantities().inferred(range.first());
      Kind kind = inferred.quantity().kind();
      boolean looked = Measures.isMeasure(kind) || inferred.basis() == Basis.DECLARED;
      if (looked && !inferred.contradictions().isEmpty()) {
        String[] notes = inferred.contradictions().toArray(String[]::new);
        matches.add(Survey.match(rule, range, null, null, notes));
      }
    }
    return matches;
  }
}
