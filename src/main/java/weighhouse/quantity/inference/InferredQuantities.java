package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.quantity.Basis;
import weighhouse.quantity.Cycle;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Outcome;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.algebra.Algebra;
import weighhouse.quantity.label.Labels;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/** The result of an inference, by cell and by expression. */
final class InferredQuantities implements Quantities {
  private final Workbook workbook;
  private final Units units;
  private final Algebra algebra;
  private final Labels labels;
  private final Cycle cycle;
  private final List<Outcome> outcomes;
  private final CellAddress threshold;
  private final boolean healthEconomic;

  InferredQuantities(
      Workbook workbook,
      Units units,
      Algebra algebra,
      Labels labels,
      Cycle cycle,
      Outcomes outcomes,
      boolean healthEconomic) {
    this.workbook = workbook;
    this.units = units;
    this.algebra = algebra;
    this.labels = labels;
    this.cycle = cycle;
    this.outcomes = outcomes.find();
    this.threshold = outcomes.threshold().orElse(null);
    this.healthEconomic = healthEconomic;
  }

  @Override
  public Quantity at(CellAddress cell) {
    Unit unit = units.at(cell);
    return unit == null ? Quantity.UNKNOWN : unit.quantity();
  }

  @Override
  public Inferred inferred(CellAddress cell) {
    Unit unit = units.at(cell);
    return unit == null
        ? new Inferred(Quantity.UNKNOWN, Basis.NONE, List.of(), List.of())
        : Evidence.of(workbook, unit);
  }

  @Override
  public Quantity of(Expr expression, CellAddress host) {
    return algebra.quantity(expression, host);
  }

  @Override
  public String label(CellAddress cell) {
    return labels.forPeople(cell);
  }

  @Override
  public List<CellRange> ranges() {
    List<CellRange> ranges = new ArrayList<>();
    for (Unit unit : units.all()) {
      boolean whole = units.at(unit.range.first()) == unit;
      if (whole && unit.kind() != Kind.UNKNOWN) {
        ranges.add(units.owned(unit));
      }
    }
    return Ranges.joined(ranges, this::at);
  }

  @Override
  public Cycle cycle() {
    return cycle;
  }

  @Override
  public List<Outcome> outcomes() {
    return outcomes;
  }

  @Override
  public Optional<CellAddress> threshold() {
    return Optional.ofNullable(threshold);
  }

  @Override
  public boolean healthEconomic() {
    return healthEconomic;
  }
}
