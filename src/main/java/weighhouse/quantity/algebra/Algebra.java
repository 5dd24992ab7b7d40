package weighhouse.quantity.algebra;

import java.util.Optional;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** What a formula gives, from what its operands are. */
public final class Algebra {
  /** Deeper trees are generated monsters; what lies below counts as unknown. */
  private static final int DEEPEST = 200;

  private final Operands operands;
  private final Functions functions = new Functions(this);

  public Algebra(Operands operands) {
    this.operands = operands;
  }

  /** The quantity of an expression in a cell; minus a hazard, say, is none. */
  public Quantity quantity(Expr expression, CellAddress host) {
    Term term = term(expression, host, 0);
    return term.isUnknown() || term.literal() || term.is(Form.NEGATIVE)
        ? new Quantity(Kind.UNKNOWN, term.quantity().role(), null)
        : term.quantity();
  }

  Operands operands() {
    return operands;
  }

  Term term(Expr node, CellAddress host, int depth) {
    if (depth > DEEPEST) {
      return Term.UNKNOWN;
    } else if (node instanceof Expr.Num number) {
      return Term.number(number.value());
    } else if (node instanceof Expr.Paren paren) {
      return term(paren.inner(), host, depth + 1);
    } else if (node instanceof Expr.Unary unary) {
      return unary(unary, host, depth + 1);
    } else if (node instanceof Expr.Binary binary) {
      return binary(binary, host, depth + 1);
    } else if (node instanceof Expr.Call call) {
      return functions.call(call, host, depth + 1);
    }
    return reference(node, host);
  }

  private Term unary(Expr.Unary unary, CellAddress host, int depth) {
    Term operand = term(unary.operand(), host, depth);
    return switch (unary.op()) {
      case MINUS -> operand.negated();
      case PERCENT -> operand.literal() ? Term.number(operand.value() / 100) : operand.moved();
      default -> operand;
    };
  }

  private Term binary(Expr.Binary binary, CellAddress host, int depth) {
    BinaryOp op = binary.op();
    if (op == BinaryOp.RANGE || op == BinaryOp.UNION || op == BinaryOp.INTERSECTION) {
      return reference(binary, host);
    } else if (op.binding() < BinaryOp.ADD.binding()) {
      return op == BinaryOp.CONCATENATE ? Term.UNKNOWN : Term.of(Kind.SWITCH);
    }
    Term a = term(binary.left(), host, depth);
    Term b = term(binary.right(), host, depth);
    Term result =
        switch (op) {
          case ADD -> Sums.add(a, b);
          case SUBTRACT -> difference(binary, a, b);
          case MULTIPLY -> Products.multiply(a, b);
          case DIVIDE -> Quotients.divide(a, b, isPart(binary.left(), binary.right()));
          default -> Powers.power(a, b);
        };
    return drawn(result, a, b);
  }

  private static Term difference(Expr.Binary binary, Term a, Term b) {
    boolean curves = a.is(Kind.SURVIVAL) && b.is(Kind.SURVIVAL);
    if (curves
        && binary.left() instanceof Expr.CellRef l
        && binary.right() instanceof Expr.CellRef r) {
      boolean sameMoment = l.row().equals(r.row()) != l.column().equals(r.column());
      boolean across = sameMoment && l.row().equals(r.row()) && l.row().value() == 0;
      boolean down = sameMoment && l.column().equals(r.column()) && l.column().value() == 0;
      // beside the host: two curves, or one curve before and after: its label has to tell
      return across || down ? Term.UNKNOWN : Term.of(Kind.PROBABILITY);
    }
    return Sums.subtract(a, b);
  }

  /** What is computed from a draw is a draw. */
  private static Term drawn(Term result, Term a, Term b) {
    boolean draw = a.quantity().role() == Role.DRAW || b.quantity().role() == Role.DRAW;
    return draw ? result.as(Role.DRAW) : result;
  }

  /** Whether a divides a sum of which it is a part, so that the quotient is a share. */
  private static boolean isPart(Expr a, Expr divisor) {
    Expr numerator = Trees.inside(a);
    Expr sum = Trees.inside(divisor);
    while (sum instanceof Expr.Binary binary && binary.op() == BinaryOp.ADD) {
      if (Trees.inside(binary.right()).equals(numerator)) {
        return true;
      }
      sum = Trees.inside(binary.left());
    }
    return sum.equals(numerator)
        || (sum instanceof Expr.Call call
            && call.function().equals("SUM")
            && Trees.children(call).stream().anyMatch(n -> n.equals(numerator)));
  }

  /** A reference, or an array of literals. */
  Term reference(Expr node, CellAddress host) {
    Optional<CellRange> cells = operands.cells(node, host);
    if (cells.isEmpty()) {
      return node instanceof Expr.NameRef name ? Term.of(operands.named(name, host)) : Term.UNKNOWN;
    }
    CellRange range = cells.get();
    Quantity quantity = operands.quantity(range);
    boolean fixed = range.size() == 1 && isFixed(node);
    double value = fixed ? operands.number(range.first()) : Double.NaN;
    return new Term(quantity, Form.PLAIN, value, false);
  }

  /** Whether the reference means the same cell wherever the formula is filled to. */
  private static boolean isFixed(Expr node) {
    Expr inner = Trees.inside(node);
    if (inner instanceof Expr.Unary unary && unary.op() == UnaryOp.AT) {
      return isFixed(unary.operand());
    }
    return !(inner instanceof Expr.CellRef cell)
        || (cell.row().absolute() && cell.column().absolute())
        || cell.sheet() != null;
  }
}
