package weighhouse.rules.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.SheetRef;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.recalculate.Values;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;

/** A workbook with the questions that checks put to it again and again. */
public final class Survey {
  /** Cells of one range that are looked at when measures are listed. */
  private static final int MOST_OF_A_RANGE = 500;

  private final Subject subject;
  private final ReferenceResolver references;

  public Survey(Subject subject) {
    this.subject = subject;
    this.references = new ReferenceResolver(subject.workbook());
  }

  public Subject subject() {
    return subject;
  }

  public ReferenceResolver references() {
    return references;
  }

  public List<Region> regions() {
    return subject.shapes().regions();
  }

  public Shape shape(Region region) {
    return subject.shapes().all().get(region.shape());
  }

  public Expr tree(Region region) {
    return shape(region).tree();
  }

  /** The one cell that an expression means in the host. */
  public Optional<CellAddress> cell(Expr node, CellAddress host) {
    return references.cell(node, host);
  }

  public Kind kind(CellAddress cell) {
    return subject.quantities().at(cell).kind();
  }

  public Kind kind(Expr node, CellAddress host) {
    return subject.quantities().of(node, host).kind();
  }

  public Quantity quantity(Expr node, CellAddress host) {
    return subject.quantities().of(node, host);
  }

  public Values base() {
    return subject.recalculation().base();
  }

  public double value(Expr node, CellAddress host) {
    return subject.recalculation().evaluate(node, host, base()).number();
  }

  /** What the cell holds; blank where nothing is stored. */
  public CellKind stored(CellAddress cell) {
    CellStore cells = cells(cell);
    int index = cells.find(cell.row(), cell.column());
    return index < 0 ? CellKind.BLANK : cells.kind(index);
  }

  /** The text stored in a cell, or null. */
  public String text(CellAddress cell) {
    CellStore cells = cells(cell);
    int index = cells.find(cell.row(), cell.column());
    return index < 0 || cells.kind(index) != CellKind.TEXT ? null : cells.text(index);
  }

  public boolean hasFormula(CellAddress cell) {
    CellStore cells = cells(cell);
    int index = cells.find(cell.row(), cell.column());
    return index >= 0 && cells.hasFormula(index);
  }

  /** Whether the cell holds a number that someone typed or pasted. */
  public boolean isTyped(CellAddress cell) {
    return stored(cell) == CellKind.NUMBER && !hasFormula(cell);
  }

  private CellStore cells(CellAddress cell) {
    return subject.workbook().sheet(cell.sheet()).cells();
  }

  /** Cells that hold the estimate of an effect measure, in the sheets' order. */
  public List<CellAddress> measures() {
    List<CellAddress> measures = new ArrayList<>();
    for (CellRange range : subject.quantities().ranges()) {
      if (Measures.isEstimate(subject.quantities().at(range.first()))) {
        spread(range, MOST_OF_A_RANGE).stream()
            .filter(cell -> stored(cell) == CellKind.NUMBER || hasFormula(cell))
            .forEach(measures::add);
      }
    }
    return measures.stream().sorted().toList();
  }

  /** The cells of a range, row by row. */
  public static List<CellAddress> cells(CellRange range) {
    List<CellAddress> cells = new ArrayList<>();
    for (int row = range.firstRow(); row <= range.lastRow(); row++) {
      for (int column = range.firstColumn(); column <= range.lastColumn(); column++) {
        cells.add(new CellAddress(range.sheet(), row, column));
      }
    }
    return cells;
  }

  /** Some cells of a range, the first and the last among them. */
  public static List<CellAddress> spread(CellRange range, int most) {
    long size = range.size();
    if (size <= most) {
      return cells(range);
    }
    List<CellAddress> cells = new ArrayList<>();
    for (int i = 0; i < most; i++) {
      long at = i * (size - 1) / (most - 1);
      int row = (int) (at / range.columns());
      int column = (int) (at % range.columns());
      cells.add(range.first().offset(row, column));
    }
    return cells;
  }

  /** The largest parts of a formula that are estimates of effect measures. */
  public List<Expr> measuresIn(Expr tree, CellAddress host) {
    List<Expr> found = new ArrayList<>();
    collect(tree, host, found);
    return found;
  }

  private void collect(Expr node, CellAddress host, List<Expr> found) {
    if (Measures.isEstimate(quantity(node, host))) {
      found.add(node);
    } else {
      Trees.children(node).forEach(child -> collect(child, host, found));
    }
  }

  /** Whether any formula reads the cell, directly or through others. */
  public boolean isRead(CellAddress cell) {
    return !subject.recalculation().dependents(Set.of(cell)).isEmpty();
  }

  /** A reference to one cell that stays when the formula of the host is filled. */
  public Expr fixed(CellAddress cell, CellAddress host) {
    String sheet = subject.workbook().sheet(cell.sheet()).name();
    return new Expr.CellRef(
        cell.sheet() == host.sheet() ? null : new SheetRef(null, sheet, null),
        new Axis(cell.row(), true),
        new Axis(cell.column(), true));
  }

  /** A reference to one cell that slides along when the formula of the host is filled. */
  public Expr relative(CellAddress cell, CellAddress host) {
    String sheet = subject.workbook().sheet(cell.sheet()).name();
    return new Expr.CellRef(
        cell.sheet() == host.sheet() ? null : new SheetRef(null, sheet, null),
        new Axis(cell.row() - host.row(), false),
        new Axis(cell.column() - host.column(), false));
  }

  /** A match on a whole range without operands. */
  public static Match match(
      Rule rule, CellRange range, Expr offending, Expr suggestion, String... notes) {
    return new Match(
        rule, List.of(range), range.first(), offending, suggestion, Map.of(), List.of(notes));
  }
}
