package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellRange;

/** A cell that is called one thing and used as another. */
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
      boolean looked = Measures.isMeasure(kind) || Measures.isEvent(kind);
      if (looked && !inferred.contradictions().isEmpty()) {
        String[] notes = inferred.contradictions().toArray(String[]::new);
        matches.add(Survey.match(rule, range, null, null, notes));
      }
    }
    return matches;
  }
}
