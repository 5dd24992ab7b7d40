package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.workbook.CellAddress;

/** The ratios of a workbook that stand beside their limits, in a row or in a column. */
public final class Estimates {
  private static final int PAIR_WITHIN = 3;
  private static final int ACROSS = 8;
  private static final int DOWN = 4;

  private final ModelView model;
  private final Map<CellAddress, Estimate> byCell = new LinkedHashMap<>();

  public Estimates(ModelView model) {
    this.model = model;
    for (CellAddress lower : model.cells(q -> Ratios.isRatio(q) && q.role() == Role.LOWER_LIMIT)) {
      if (!inRow(lower)) {
        inColumn(lower);
      }
    }
  }

  public List<Estimate> all() {
    return List.copyOf(byCell.values());
  }

  /** The interval of a ratio, or of the ratio that the cell only refers to. */
  public Optional<Estimate> of(CellAddress cell) {
    return Optional.ofNullable(byCell.get(cell));
  }

  /** The estimate that a limit belongs to. */
  public Optional<Estimate> ofLimit(CellAddress limit) {
    return byCell.values().stream()
        .filter(e -> e.lower().equals(limit) || e.upper().equals(limit))
        .findFirst();
  }

  private boolean inRow(CellAddress lower) {
    return pair(lower, 0, 1, ACROSS, ACROSS);
  }

  private void inColumn(CellAddress lower) {
    pair(lower, 1, 0, DOWN, 2);
  }

  private boolean pair(CellAddress lower, int down, int right, int before, int after) {
    Quantity wanted = model.quantity(lower);
    Optional<CellAddress> upper = nearest(lower, wanted, Role.UPPER_LIMIT, down, right);
    if (upper.isEmpty()) {
      return false;
    }
    List<CellAddress> estimates = new ArrayList<>();
    for (int step = 1; step <= Math.max(before, after); step++) {
      if (step <= before) {
        add(lower.offset(-step * down, -step * right), wanted, estimates);
      }
      if (step <= after) {
        add(lower.offset(step * down, step * right), wanted, estimates);
      }
    }
    // The live value beside it may be a draw or a choice: what was typed in is what has limits.
    Optional<CellAddress> typed =
        estimates.stream().filter(cell -> model.formula(cell) == null).findFirst();
    Optional<CellAddress> estimate = typed.or(() -> estimates.stream().findFirst());
    estimate.ifPresent(e -> byCell.put(e, new Estimate(e, lower, upper.get())));
    return estimate.isPresent();
  }

  private Optional<CellAddress> nearest(
      CellAddress from, Quantity like, Role role, int down, int right) {
    for (int step = 1; step <= PAIR_WITHIN; step++) {
      for (int sign : new int[] {1, -1}) {
        CellAddress cell = from.offset(sign * step * down, sign * step * right);
        Quantity quantity = quantityAt(cell);
        if (quantity.kind() == like.kind() && quantity.role() == role) {
          return Optional.of(cell);
        }
      }
    }
    return Optional.empty();
  }

  private void add(CellAddress cell, Quantity like, List<CellAddress> found) {
    Quantity quantity = quantityAt(cell);
    if (quantity.kind() == like.kind()
        && quantity.role() == Role.ESTIMATE
        && model.value(cell) > 0) {
      found.add(cell);
    }
  }

  private Quantity quantityAt(CellAddress cell) {
    return cell.row() < 0 || cell.column() < 0 ? Quantity.UNKNOWN : model.quantity(cell);
  }
}
