package weighhouse.audit.probe;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.recalculate.Values;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * The effect measures that a workbook holds: typed-in ones, and calculated ones that rest on no
 * other entry of the ledger (the exponential of a coefficient, say).
 */
public final class Ledger {
  /** How far along a row or column the limits of an estimate are looked for. */
  private static final int REACH = 8;

  private final Subject subject;
  private final Values values;

  public Ledger(Subject subject, Values values) {
    this.subject = subject;
    this.values = values;
  }

  /** An entry with its limits, NaN where none are found. */
  public record Entry(CellAddress cell, Kind kind, double value, double lower, double upper) {}

  public List<Entry> entries() {
    List<CellAddress> typed = new ArrayList<>();
    List<CellAddress> calculated = new ArrayList<>();
    for (CellRange range : subject.quantities().ranges()) {
      Quantity quantity = subject.quantities().at(range.first());
      if (quantity.role() != Role.ESTIMATE || RatioLaw.of(quantity.kind()).isEmpty()) {
        continue;
      }
      for (CellAddress cell : CellsOf.stored(subject.workbook(), range)) {
        if (!Double.isNaN(values.number(cell))) {
          (subject.shapes().at(cell) == null ? typed : calculated).add(cell);
        }
      }
    }
    List<CellAddress> roots = new ArrayList<>(typed);
    Set<CellAddress> derived = new HashSet<>();
    Set<CellAddress> candidates = new HashSet<>(calculated);
    typed.forEach(cell -> addDependents(cell, candidates, derived));
    for (CellAddress cell : calculated) {
      if (!derived.contains(cell)) {
        roots.add(cell);
        addDependents(cell, candidates, derived);
      }
    }
    return roots.stream().sorted().map(this::entry).toList();
  }

  private void addDependents(CellAddress cell, Set<CellAddress> among, Set<CellAddress> into) {
    if (among.isEmpty()) {
      return;
    }
    List<CellRange> ranges = subject.recalculation().dependents(Set.of(cell));
    for (CellAddress candidate : among) {
      if (!candidate.equals(cell) && ranges.stream().anyMatch(r -> r.contains(candidate))) {
        into.add(candidate);
      }
    }
  }

  private Entry entry(CellAddress cell) {
    Kind kind = subject.quantities().at(cell).kind();
    return new Entry(
        cell,
        kind,
        values.number(cell),
        limit(cell, kind, Role.LOWER_LIMIT),
        limit(cell, kind, Role.UPPER_LIMIT));
  }

  private double limit(CellAddress cell, Kind kind, Role role) {
    for (int step = 1; step <= REACH; step++) {
      for (CellAddress near : List.of(cell.offset(0, step), cell.offset(step, 0))) {
        Optional<Double> found = limitAt(near, kind, role);
        if (found.isPresent()) {
          return found.get();
        }
      }
    }
    return Double.NaN;
  }

  private Optional<Double> limitAt(CellAddress cell, Kind kind, Role role) {
    Quantity quantity = subject.quantities().at(cell);
    double number = values.number(cell);
    return quantity.kind() == kind && quantity.role() == role && !Double.isNaN(number)
        ? Optional.of(number)
        : Optional.empty();
  }
}
