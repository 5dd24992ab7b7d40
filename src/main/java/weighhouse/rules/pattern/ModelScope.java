package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Shape;
import weighhouse.formula.Shapes;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantities;
import weighhouse.rules.term.Scope;
import weighhouse.rules.term.Term;
import weighhouse.rules.term.Translator;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/**
 * The model as terms see it. A cell whose quantity is known is a symbol; a helper cell of which
 * nothing is known is its formula, so that a calculation spread over helpers reads like one.
 */
public final class ModelScope implements Scope {
  private static final Set<Kind> REDUCTIONS =
      EnumSet.of(Kind.HAZARD_REDUCTION, Kind.RISK_REDUCTION, Kind.RELATIVE_REDUCTION);
  private static final int DEEPEST = 8;
  private static final int MOST_CELLS = 24;
  private static final int LONGEST_HELPER = 60;

  private final Workbook workbook;
  private final Shapes shapes;
  private final Quantities quantities;
  private final ReferenceResolver references;
  private int depth;

  public ModelScope(Workbook workbook, Shapes shapes, Quantities quantities) {
    this.workbook = workbook;
    this.shapes = shapes;
    this.quantities = quantities;
    this.references = new ReferenceResolver(workbook);
  }

  public Workbook workbook() {
    return workbook;
  }

  public Quantities quantities() {
    return quantities;
  }

  @Override
  public Term term(Expr reference, CellAddress host, Translator translator) {
    CellAddress cell = cell(reference, host);
    if (cell != null) {
      return cell(cell, translator);
    }
    if (reference instanceof Expr.NameRef name && depth < DEEPEST) {
      Optional<Expr> meaning = references.names().resolve(name, host.sheet());
      if (meaning.isPresent() && references.range(meaning.get(), host).isEmpty()) {
        return deeper(meaning.get(), host, translator);
      }
    }
    return translator.terms().symbol(new Place(reference, host));
  }

  /** What makes a reference that is no single cell the same as another. */
  private record Place(Expr reference, int sheet, int row, int column) {
    Place(Expr reference, CellAddress host) {
      this(reference, host.sheet(), host.row(), host.column());
    }
  }

  /** The single cell that a reference or name means in the host; null where it means none. */
  public CellAddress cell(Expr reference, CellAddress host) {
    boolean several = reference instanceof Expr.AreaRef || !Trees.children(reference).isEmpty();
    return several ? null : references.cell(reference, host).orElse(null);
  }

  private Term cell(CellAddress cell, Translator translator) {
    Shape shape = shapes.at(cell);
    boolean opened =
        shape != null
            && depth < DEEPEST
            && Trees.walk(shape.tree()).size() <= LONGEST_HELPER
            && isHelper(cell, shape);
    return opened
        ? translator.once(cell, () -> deeper(shape.tree(), cell, translator))
        : translator.terms().symbol(cell);
  }

  /** A cell that says nothing by itself, or holds what a ratio takes off a probability. */
  private boolean isHelper(CellAddress cell, Shape shape) {
    Kind kind = quantities.at(cell).kind();
    return kind == Kind.UNKNOWN
        || (kind == Kind.PROBABILITY
            && Chains.factors(shape.tree()).stream()
                .filter(factor -> !factor.isSign())
                .anyMatch(f -> REDUCTIONS.contains(quantities.of(f.node(), cell).kind())));
  }

  private Term deeper(Expr formula, CellAddress at, Translator translator) {
    depth++;
    try {
      return translator.elsewhere(formula, at);
    } finally {
      depth--;
    }
  }

  @Override
  public List<Expr> cells(Expr area, CellAddress host) {
    Expr.AreaRef range = (Expr.AreaRef) area;
    int firstRow = range.row1().resolve(host.row());
    int lastRow = range.row2().resolve(host.row());
    int firstColumn = range.column1().resolve(host.column());
    int lastColumn = range.column2().resolve(host.column());
    long size = (lastRow - firstRow + 1L) * (lastColumn - firstColumn + 1L);
    List<Expr> cells = new ArrayList<>();
    if (size > 0 && size <= MOST_CELLS) {
      for (int row = firstRow; row <= lastRow; row++) {
        for (int column = firstColumn; column <= lastColumn; column++) {
          Axis relativeRow = axis(row, range.row1(), host.row());
          Axis relativeColumn = axis(column, range.column1(), host.column());
          cells.add(new Expr.CellRef(range.sheet(), relativeRow, relativeColumn));
        }
      }
    }
    return cells;
  }

  private static Axis axis(int index, Axis like, int host) {
    return like.absolute() ? new Axis(index, true) : new Axis(index - host, false);
  }
}
