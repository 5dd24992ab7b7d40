package weighhouse.rules.check.competing;

import java.util.HashMap;
import java.util.Map;
import weighhouse.recalculate.Change;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.Values;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;

/** The model as it would run if no effect measure had any effect. */
final class Neutral {
  private Neutral() {}

  static Values values(Survey survey) {
    Map<CellAddress, Value> values = new HashMap<>();
    for (CellAddress cell : survey.measures()) {
      values.put(cell, new Value.Num(Measures.neutral(survey.kind(cell))));
    }
    return survey.subject().recalculation().whatIf(new Change(values, Map.of()));
  }
}
