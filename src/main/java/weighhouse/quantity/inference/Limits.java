package weighhouse.quantity.inference;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.label.Guess;
import weighhouse.quantity.vocabulary.Strength;
import weighhouse.workbook.CellAddress;

/** Limits and standard errors whose own label does not say of what: of the estimate beside them. */
final class Limits {
  private static final Set<Role> BELONG =
      EnumSet.of(Role.LOWER_LIMIT, Role.UPPER_LIMIT, Role.STANDARD_ERROR);

  private static final int REACH = 4;

  private final Units units;

  Limits(Units units) {
    this.units = units;
  }

  void assign() {
    for (Unit unit : units.all()) {
      if (BELONG.contains(unit.guess.role()) && !unit.guess.known(Strength.CLEAR)) {
        assign(unit);
      }
    }
  }

  private void assign(Unit unit) {
    for (int step = 1; step <= REACH; step++) {
      for (CellAddress near : List.of(unit.host().offset(-step, 0), unit.host().offset(0, -step))) {
        Unit estimate = units.at(near);
        boolean tells =
            estimate != null
                && estimate.guess.role() == Role.ESTIMATE
                && estimate.guess.known(Strength.CLEAR);
        if (tells) {
          unit.guess = of(estimate.guess, unit.guess.role());
          return;
        }
      }
    }
  }

  private static Guess of(Guess estimate, Role role) {
    Kind kind = estimate.kind();
    Quantity quantity = new Quantity(kind, role, estimate.quantity().span());
    return new Guess(quantity, Strength.CLEAR, false, estimate.labels());
  }
}
