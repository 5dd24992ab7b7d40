package weighhouse.formula.normal;

import java.util.HashSet;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Trees;
import weighhouse.formula.normal.Normaliser.Scope;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** References and names: cells, areas, variables, or the formulas that stand behind them. */
final class ReferenceConversion {
  /** Steps from helper cell to helper cell. */
  private static final int MAX_HELPER_DEPTH = 12;

  /** Formulas put in place of references in one conversion, so that it stays fast. */
  private static final int MAX_EXPANSIONS = 200;

  private final Normaliser settings;
  private final ReferenceResolver resolver;
  private final Conversion conversion;

  /** What is being expanded: cells and name formulas; meeting one again is a circle. */
  private final Set<Object> open = new HashSet<>();

  private int expansions;

  ReferenceConversion(Normaliser settings, Conversion conversion) {
    this.settings = settings;
    this.resolver = settings.references();
    this.conversion = conversion;
  }

  static boolean isReference(Expr node) {
    Expr inner = Trees.inside(node);
    return inner instanceof Expr.NameRef
        || inner instanceof Expr.CellRef
        || inner instanceof Expr.AreaRef
        || inner instanceof Expr.ColumnsRef
        || inner instanceof Expr.RowsRef
        || inner instanceof Expr.TableRef;
  }

  Poly convert(Expr node, Scope scope) {
    if (node instanceof Expr.NameRef name) {
      Poly variable = name.sheet() == null ? scope.variable(name.name()) : null;
      if (variable != null) {
        return variable;
      }
    }
    if (resolver != null) {
      Optional<Poly> resolved = resolved(node, scope);
      if (resolved.isPresent()) {
        return resolved.get();
      }
    }
    if (node instanceof Expr.NameRef name && name.sheet() == null) {
      return named(name, scope);
    }
    return Poly.of(new Atom.Other(node, scope.host()));
  }

  private Optional<Poly> resolved(Expr node, Scope scope) {
    Optional<CellRange> range = resolver.range(node, scope.host());
    boolean one = range.filter(r -> r.size() == 1).isPresent();
    if (!scope.array() || one) {
      Optional<CellAddress> cell = resolver.cell(node, scope.host());
      if (cell.isPresent()) {
        return cell.map(address -> cell(address, scope));
      }
    }
    return range.map(r -> Poly.of(new Atom.Area(r)));
  }

  private Poly cell(CellAddress address, Scope scope) {
    Optional<Hosted> formula =
        open.size() < MAX_HELPER_DEPTH && expansions < MAX_EXPANSIONS && !open.contains(address)
            ? settings.helpers().formula(address)
            : Optional.empty();
    if (formula.isEmpty()) {
      return Poly.of(new Atom.Cell(address));
    }
    return expanded(address, formula.get().node(), scope.on(formula.get().host()));
  }

  private Poly expanded(Object what, Expr tree, Scope scope) {
    open.add(what);
    expansions++;
    Poly poly = conversion.convert(tree, scope);
    open.remove(what);
    return poly;
  }

  /** The formula a name stands for; names for mere constants stay names. */
  private Poly named(Expr.NameRef name, Scope scope) {
    Optional<Expr> tree =
        resolver == null ? Optional.empty() : resolver.names().resolve(name, scope.host().sheet());
    String key = name.name().toUpperCase(Locale.ROOT);
    boolean formula =
        tree.isPresent()
            && !open.contains(key)
            && open.size() < MAX_HELPER_DEPTH
            && Trees.contains(tree.get(), ReferenceConversion::isReference);
    return formula ? expanded(key, tree.get(), scope.deeper()) : Poly.of(new Atom.Name(key));
  }
}
