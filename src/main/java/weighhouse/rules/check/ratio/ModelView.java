package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.Shapes;
import weighhouse.quantity.Quantity;
import weighhouse.recalculate.Values;
import weighhouse.rules.Subject;
import weighhouse.rules.pattern.ModelScope;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** A workbook as the checks of ratios look at it. */
public final class ModelView {
  /** A column longer than this is a run over time or a store of draws, looked at by its start. */
  private static final int MOST_CELLS = 400;

  private final Subject subject;
  private final ModelScope scope;
  private final Values base;

  public ModelView(Subject subject) {
    this.subject = subject;
    this.scope = new ModelScope(subject.workbook(), subject.shapes(), subject.quantities());
    this.base = subject.recalculation().base();
  }

  public Subject subject() {
    return subject;
  }

  /** The one cell that a reference or name means in the host; null where it means none. */
  public CellAddress cell(Expr reference, CellAddress host) {
    return scope.cell(reference, host);
  }

  public Quantity quantity(Expr expression, CellAddress host) {
    return subject.quantities().of(expression, host);
  }

  public Quantity quantity(CellAddress cell) {
    return subject.quantities().at(cell);
  }

  /** Present number of a cell; NaN where it has none. */
  public double value(CellAddress cell) {
    return base.number(cell);
  }

  /** Present number of an expression; NaN where it has none. */
  public double value(Expr expression, CellAddress host) {
    return subject.recalculation().evaluate(expression, host, base).number();
  }

  /** The formula of a cell, relative to it; null of constants. */
  public Expr formula(CellAddress cell) {
    Shape shape = subject.shapes().at(cell);
    return shape == null ? null : shape.tree();
  }

  /** The formula of a cell with all the cells it fills; empty of constants. */
  public Optional<Place> place(CellAddress cell) {
    Region region = subject.shapes().regionAt(cell);
    return region == null ? Optional.empty() : Optional.of(place(region));
  }

  /** The formulas for which the condition holds, with the cells they fill. */
  public List<Place> places(Predicate<Expr> condition) {
    Shapes shapes = subject.shapes();
    boolean[] wanted = new boolean[shapes.all().size()];
    for (Shape shape : shapes.all()) {
      wanted[shape.id()] = condition.test(shape.tree());
    }
    return shapes.regions().stream()
        .filter(region -> wanted[region.shape()])
        .map(this::place)
        .toList();
  }

  private Place place(Region region) {
    return new Place(region.range(), subject.shapes().all().get(region.shape()).tree());
  }

  /** The cells whose quantity is wanted, in the workbook's order. */
  public List<CellAddress> cells(Predicate<Quantity> wanted) {
    List<CellAddress> cells = new ArrayList<>();
    for (CellRange range : subject.quantities().ranges()) {
      if (wanted.test(quantity(range.first()))) {
        addCells(range, cells);
      }
    }
    cells.sort(null);
    return cells;
  }

  private static void addCells(CellRange range, List<CellAddress> cells) {
    int room = cells.size() + MOST_CELLS;
    for (int row = range.firstRow(); row <= range.lastRow(); row++) {
      for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
        if (cells.size() < room) {
          cells.add(new CellAddress(range.sheet(), row, column));
        }
      }
    }
  }

  /** The formulas in cells whose quantity is wanted, each once. */
  public List<Place> placesOf(Predicate<Quantity> wanted) {
    Set<Place> places = new LinkedHashSet<>();
    for (CellAddress cell : cells(wanted)) {
      place(cell).ifPresent(places::add);
    }
    return List.copyOf(places);
  }
}
