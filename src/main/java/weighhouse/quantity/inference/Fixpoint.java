package weighhouse.quantity.inference;

import java.util.BitSet;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.algebra.Algebra;
import weighhouse.quantity.algebra.Demand;
import weighhouse.quantity.algebra.Demands;

/** Runs the algebra up and down between units until nothing changes any more. */
final class Fixpoint {
  /** Knowledge that still changes after so many rounds goes in a circle. */
  private static final int MOST_ROUNDS = 24;

  private static final int MOST_DEMANDED = 64;

  private final Units units;
  private final Links links;
  private final Algebra algebra;
  private BitSet due = new BitSet();

  Fixpoint(Units units, Links links, Algebra algebra) {
    this.units = units;
    this.links = links;
    this.algebra = algebra;
  }

  void run() {
    due.set(0, units.size());
    for (int round = 0; round < MOST_ROUNDS && !due.isEmpty(); round++) {
      BitSet now = due;
      due = new BitSet(units.size());
      for (int id = now.nextSetBit(0); id >= 0; id = now.nextSetBit(id + 1)) {
        visit(units.get(id), round < MOST_ROUNDS / 2);
      }
    }
  }

  private void visit(Unit unit, boolean mayDemand) {
    if (unit.isCalculated()) {
      unit.up = algebra.quantity(unit.tree, unit.host());
    }
    settle(unit);
    if (unit.isCalculated() && mayDemand) {
      for (Demand demand :
          Demands.of(algebra, unit.tree, unit.host(), unit.quantity(), unit.trace)) {
        meet(demand, unit);
      }
    }
  }

  private void meet(Demand demand, Unit from) {
    for (Unit operand : units.in(demand.cells(), MOST_DEMANDED)) {
      if (operand != from && operand.add(demand)) {
        settle(operand);
      }
    }
  }

  private void settle(Unit unit) {
    Quantity before = unit.quantity();
    unit.verdict = Judge.of(unit);
    if (!before.equals(unit.quantity())) {
      due.set(unit.id);
      for (int id : links.dependents(unit)) {
        due.set(id);
      }
    }
  }
}
