package weighhouse.rules.check.ratio;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.workbook.CellAddress;

/** The ratios of a workbook that stand beside their limits, in a row or in a column. */
public final class Estimates {
  private static final int ACROSS = 8;
  private static final int DOWN = 4;
  private static final int APART = 3;

  private final ModelView model;
  private final LimitWords words;
  private final Map<CellAddress, Estimate> byCell = new LinkedHashMap<>();
  private final Map<CellAddress, Role> limits = new HashMap<>();

  public Estimates(ModelView model) {
    this.model = model;
    this.words = new LimitWords(model);
    for (CellAddress cell : model.cells(Ratios::isLimit)) {
      limits.put(cell, model.quantity(cell).role());
    }
    Map<CellAddress, Near> nearest = new LinkedHashMap<>();
    for (CellAddress cell : model.cells(Ratios::isEstimate)) {
      near(cell).ifPresent(near -> nearest.merge(near.estimate().lower(), near, Estimates::better));
    }
    for (Near near : nearest.values()) {
      Estimate estimate = near.estimate();
      byCell.put(estimate.cell(), estimate);
      limits.put(estimate.lower(), Role.LOWER_LIMIT);
      limits.put(estimate.upper(), Role.UPPER_LIMIT);
    }
  }

  /** A ratio with limits that may be nearer to another ratio. */
  private record Near(Estimate estimate, boolean typed, int distance) {}

  /** The live value beside a typed-in one may be a draw or a choice: what was typed has limits. */
  private static Near better(Near a, Near b) {
    if (a.typed() != b.typed()) {
      return a.typed() ? a : b;
    }
    return b.distance() < a.distance() ? b : a;
  }

  public List<Estimate> all() {
    return List.copyOf(byCell.values());
  }

  /** The interval of a ratio. */
  public Optional<Estimate> of(CellAddress cell) {
    return Optional.ofNullable(byCell.get(cell));
  }

  /** The estimate that a limit belongs to. */
  public Optional<Estimate> ofLimit(CellAddress limit) {
    return byCell.values().stream()
        .filter(e -> e.lower().equals(limit) || e.upper().equals(limit))
        .findFirst();
  }

  /** Whether a cell is a limit of a ratio, and which; empty if none. */
  public Optional<Role> limit(CellAddress cell) {
    return Optional.ofNullable(limits.get(cell));
  }

  /** All limits of ratios, in the workbook's order. */
  public List<CellAddress> limits() {
    return limits.keySet().stream().sorted().toList();
  }

  private Optional<Near> near(CellAddress cell) {
    if (!(model.value(cell) > 0)) {
      return Optional.empty();
    }
    return along(cell, 0, 1, ACROSS).or(() -> along(cell, 1, 0, DOWN));
  }

  private Optional<Near> along(CellAddress cell, int down, int right, int reach) {
    Quantity quantity = model.quantity(cell);
    for (int step = 1; step <= reach; step++) {
      for (int sign : new int[] {1, -1}) {
        CellAddress lower = cell.offset(sign * step * down, sign * step * right);
        if (isLimit(lower, Role.LOWER_LIMIT, quantity.kind(), down == 0)) {
          Optional<CellAddress> upper = upper(lower, quantity.kind(), down, right);
          if (upper.isPresent()) {
            Estimate estimate = new Estimate(cell, lower, upper.get());
            return Optional.of(new Near(estimate, model.formula(cell) == null, step));
          }
        }
      }
    }
    return Optional.empty();
  }

  private Optional<CellAddress> upper(CellAddress lower, Kind kind, int down, int right) {
    for (int step = 1; step <= APART; step++) {
      for (int sign : new int[] {1, -1}) {
        CellAddress cell = lower.offset(sign * step * down, sign * step * right);
        if (isLimit(cell, Role.UPPER_LIMIT, kind, down == 0)) {
          return Optional.of(cell);
        }
      }
    }
    return Optional.empty();
  }

  private boolean isLimit(CellAddress cell, Role role, Kind kind, boolean beside) {
    return cell.row() >= 0 && cell.column() >= 0 && words.isLimit(cell, role, kind, beside);
  }
}
