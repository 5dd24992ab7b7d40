package weighhouse.audit.pipeline;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.audit.Brief;
import weighhouse.quantity.Cycle;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Outcome;
import weighhouse.quantity.Quantity;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/** What the brief declares, resolved in the workbook, over what was inferred. */
final class Declared {
  private Declared() {}

  /** Declarations of ranges that the workbook has; others are left out. */
  static Declarations in(Workbook workbook, Brief brief) {
    Map<CellRange, Quantity> quantities = new LinkedHashMap<>();
    brief
        .quantities()
        .forEach(
            (text, quantity) ->
                A1Text.range(workbook, text).ifPresent(r -> quantities.put(r, quantity)));
    return new Declarations(quantities, brief.cycleYears());
  }

  /** Inferred outcomes; only those named in the brief where it names any. */
  static List<Outcome> outcomes(Subject subject, Brief brief) {
    List<Outcome> inferred = subject.quantities().outcomes();
    if (brief.outcomes().isEmpty()) {
      return inferred;
    }
    return brief.outcomes().stream()
        .flatMap(text -> A1Text.range(subject.workbook(), text).stream())
        .map(range -> outcome(subject, inferred, range.first()))
        .toList();
  }

  private static Outcome outcome(Subject subject, List<Outcome> inferred, CellAddress cell) {
    return inferred.stream()
        .filter(outcome -> outcome.cell().equals(cell))
        .findFirst()
        .orElseGet(
            () ->
                new Outcome(
                    cell,
                    subject.quantities().at(cell).kind(),
                    false,
                    subject.quantities().label(cell)));
  }

  static double threshold(Subject subject, Brief brief) {
    if (Double.isFinite(brief.threshold())) {
      return brief.threshold();
    }
    Optional<CellAddress> cell = subject.quantities().threshold();
    return cell.map(c -> subject.recalculation().base().number(c)).orElse(Double.NaN);
  }

  /** {@code 0.0833 years}; null where the workbook does not tell. */
  static String cycleInWords(Cycle cycle) {
    return cycle.known() ? String.format(java.util.Locale.ROOT, "%.4g years", cycle.years()) : null;
  }
}
