package weighhouse.rules.check.evidence;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.workbook.CellAddress;

/** The hazard ratios that a workbook uses as one number for all time. */
final class EnteredRatios {
  private static final Set<Kind> EVENTS =
      EnumSet.of(
          Kind.PROBABILITY, Kind.RATE, Kind.CUMULATIVE_HAZARD, Kind.SURVIVAL, Kind.OCCUPANCY);

  private EnteredRatios() {}

  /** Hazard ratios that are typed in, or at least no column over time and no draw. */
  static List<CellAddress> in(ModelView model) {
    return model.cells(EnteredRatios::isHazardRatio).stream()
        .filter(cell -> isConstant(cell, model))
        .toList();
  }

  private static boolean isHazardRatio(Quantity quantity) {
    return quantity.kind() == Kind.HAZARD_RATIO && quantity.role() == Role.ESTIMATE;
  }

  private static boolean isConstant(CellAddress cell, ModelView model) {
    Expr formula = model.formula(cell);
    return model.value(cell) > 0
        && (formula == null
            || (!Parts.draws(formula) && model.place(cell).orElseThrow().range().size() == 1));
  }

  /** Whether the ratio moves something that happens in the model. */
  static boolean isUsed(CellAddress ratio, ModelView model) {
    return model.subject().recalculation().dependents(Set.of(ratio)).stream()
        .anyMatch(range -> EVENTS.contains(model.quantity(range.first()).kind()));
  }
}
