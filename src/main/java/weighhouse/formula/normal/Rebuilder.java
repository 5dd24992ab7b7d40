package weighhouse.formula.normal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.Axis;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.SheetRef;
import weighhouse.formula.UnaryOp;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/**
 * From normal forms back to trees relative to a host. What was written in the host's own formula is
 * used as it was written.
 */
public final class Rebuilder {
  private final Workbook workbook;
  private final CellAddress host;
  private final Origins origins;

  /**
   * @param workbook for the names of other sheets
   * @param host the cell that the trees are for
   * @param origins parts to reuse
   */
  public Rebuilder(Workbook workbook, CellAddress host, Origins origins) {
    this.workbook = workbook;
    this.host = host;
    this.origins = origins;
  }

  /** The sum as a tree; the printer adds the parentheses. */
  public Expr expr(Poly poly) {
    Optional<Hosted> written = origins.in(host, poly);
    if (written.isPresent()) {
      return written.get().node();
    }
    Expr sum = null;
    for (Term term : positiveFirst(poly)) {
      boolean negative = term.coefficient().isNegative();
      if (sum == null) {
        sum = term(term);
      } else if (negative) {
        Term positive = term.withCoefficient(term.coefficient().negated());
        sum = new Expr.Binary(BinaryOp.SUBTRACT, sum, term(positive));
      } else {
        sum = new Expr.Binary(BinaryOp.ADD, sum, term(term));
      }
    }
    return sum == null ? number(0) : sum;
  }

  /** The atom as a tree. */
  public Expr expr(Atom atom) {
    Optional<Hosted> written = origins.in(host, Poly.of(atom));
    return written.isPresent() ? written.get().node() : unwritten(atom);
  }

  private static List<Term> positiveFirst(Poly poly) {
    List<Term> ordered = new ArrayList<>(poly.terms());
    ordered.sort(Comparator.comparing(term -> term.coefficient().isNegative()));
    return ordered;
  }

  private Expr term(Term term) {
    Expr above = null;
    Expr below = null;
    Coefficient coefficient = term.coefficient();
    boolean negative = coefficient.isNegative();
    if (coefficient.abs().numerator() != 1 || !hasNumerator(term)) {
      above = number(coefficient.abs().numerator());
    }
    if (coefficient.denominator() != 1) {
      below = number(coefficient.denominator());
    }
    for (Map.Entry<Atom, Poly> factor : term.factors().entrySet()) {
      boolean under = isUnder(factor);
      Poly exponent =
          under ? new Arithmetic(Level.EXPANDED).negate(factor.getValue()) : factor.getValue();
      Expr power = power(factor.getKey(), exponent);
      above = under ? above : times(above, power);
      below = under ? times(below, power) : below;
    }
    Expr numerator = negative ? negated(above) : above;
    return below == null ? numerator : new Expr.Binary(BinaryOp.DIVIDE, numerator, below);
  }

  /** Minus the first factor of a product; a power or sum as a whole. */
  private static Expr negated(Expr node) {
    if (node instanceof Expr.Binary binary
        && (binary.op() == BinaryOp.MULTIPLY || binary.op() == BinaryOp.DIVIDE)) {
      return new Expr.Binary(binary.op(), negated(binary.left()), binary.right());
    }
    return new Expr.Unary(UnaryOp.MINUS, node);
  }

  private static boolean hasNumerator(Term term) {
    return term.factors().entrySet().stream().anyMatch(factor -> !isUnder(factor));
  }

  /** Whether a factor is written below the line. */
  private static boolean isUnder(Map.Entry<Atom, Poly> factor) {
    return !(factor.getKey() instanceof Atom.Euler)
        && factor.getValue().constant().filter(Coefficient::isNegative).isPresent();
  }

  private static Expr times(Expr left, Expr right) {
    return left == null ? right : new Expr.Binary(BinaryOp.MULTIPLY, left, right);
  }

  private Expr power(Atom base, Poly exponent) {
    if (base instanceof Atom.Euler) {
      return new Expr.Call("EXP", List.of(expr(exponent)));
    }
    Expr node = expr(base);
    return exponent.isOne() ? node : new Expr.Binary(BinaryOp.POWER, node, expr(exponent));
  }

  private Expr unwritten(Atom atom) {
    if (atom instanceof Atom.Cell cell) {
      return cell(cell.address());
    } else if (atom instanceof Atom.Area area) {
      return area(area.range());
    } else if (atom instanceof Atom.Name name) {
      return new Expr.NameRef(null, name.name());
    } else if (atom instanceof Atom.Sum sum) {
      return expr(sum.sum());
    } else if (atom instanceof Atom.Constant constant) {
      return expr(Poly.constant(constant.value()));
    } else if (atom instanceof Atom.Function function) {
      return function(function);
    } else if (atom instanceof Atom.Other other) {
      return other.node();
    }
    return new Expr.Call("EXP", List.of(number(1)));
  }

  private Expr function(Atom.Function function) {
    List<Expr> arguments = function.arguments().stream().map(this::expr).toList();
    for (BinaryOp op : BinaryOp.values()) {
      if (op.symbol().equals(function.name()) && arguments.size() == 2) {
        return new Expr.Binary(op, arguments.get(0), arguments.get(1));
      }
    }
    if (function.name().equals("#")) {
      return new Expr.SpillRef(arguments.get(0));
    }
    return new Expr.Call(function.name().replaceFirst("~.*", ""), arguments);
  }

  private SheetRef sheet(int index) {
    return index == host.sheet() ? null : new SheetRef(null, workbook.sheet(index).name(), null);
  }

  private static Expr number(double value) {
    if (Double.isNaN(value) || Double.isInfinite(value)) {
      return new Expr.ErrorLiteral("#NUM!");
    }
    String text = BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    return new Expr.Num(value, text.length() > 20 ? Double.toString(value) : text);
  }

  /** Relative on the host's own sheet, absolute on others, as modellers refer to inputs. */
  private Expr cell(CellAddress cell) {
    boolean own = cell.sheet() == host.sheet();
    return new Expr.CellRef(
        sheet(cell.sheet()),
        new Axis(own ? cell.row() - host.row() : cell.row(), !own),
        new Axis(own ? cell.column() - host.column() : cell.column(), !own));
  }

  private Expr area(CellRange range) {
    return new Expr.AreaRef(
        sheet(range.sheet()),
        new Axis(range.firstRow(), true),
        new Axis(range.firstColumn(), true),
        new Axis(range.lastRow(), true),
        new Axis(range.lastColumn(), true));
  }
}
