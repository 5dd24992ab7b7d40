package weighhouse.rules.check.uncertainty;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Estimate;
import weighhouse.rules.check.ratio.Estimates;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** What the checks of an estimate against its limits have in common. */
abstract class IntervalCheck implements Check {
  @Override
  public final List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    List<Match> matches = new ArrayList<>();
    for (Estimate estimate : new Estimates(model).all()) {
      Printed printed = Printed.of(estimate, model);
      boolean settled =
          isSettled(estimate.cell(), model)
              && isSettled(estimate.lower(), model)
              && isSettled(estimate.upper(), model);
      String fault = settled && printed.positive() ? fault(estimate, printed, model) : null;
      if (fault != null) {
        matches.add(match(rule, estimate, fault, subject.workbook()));
      }
    }
    return matches;
  }

  /** What is wrong, in one sentence; null if nothing is. */
  abstract String fault(Estimate estimate, Printed printed, ModelView model);

  /** Chance has no interval. */
  private static boolean isSettled(CellAddress cell, ModelView model) {
    return model.formula(cell) == null || !Parts.draws(model.formula(cell));
  }

  private static Match match(Rule rule, Estimate estimate, String fault, Workbook workbook) {
    CellAddress host = estimate.cell();
    return Found.at(rule, host)
        .with("r", Refs.to(host, host, workbook))
        .with("l", Refs.to(estimate.lower(), host, workbook))
        .with("u", Refs.to(estimate.upper(), host, workbook))
        .saying(fault)
        .match();
  }
}
