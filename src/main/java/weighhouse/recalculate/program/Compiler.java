package weighhouse.recalculate.program;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.UnaryOp;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.FaultException;
import weighhouse.workbook.CellAddress;

/** Compiles one formula. Trees deeper than the parser allows do not arrive here. */
public final class Compiler {
  private static final int DEEPEST_NAME = 32;

  private final Names names;
  private final References references;
  private final boolean across;
  private final List<Footprint> cells = new ArrayList<>();
  private final List<Footprint> ranges = new ArrayList<>();
  private final Deque<String> namesOpen = new ArrayDeque<>();
  private final CallCompiler calls;
  private boolean unread;
  boolean drawing;
  boolean pointing;

  private Compiler(Names names, CellAddress host, boolean across) {
    this.names = names;
    this.references = new References(names, host);
    this.across = across;
    this.calls = new CallCompiler(this);
  }

  /**
   * Compiles a formula for hosts on one sheet (and in one table).
   *
   * @param host any of the hosts
   * @param across whether the lines of the hosts' sheet are its rows
   * @param array whether operators work on whole ranges
   * @throws UnsupportedFormulaException where it cannot be run
   */
  public static Program compile(
      Expr tree, CellAddress host, boolean array, boolean across, Names names) {
    Compiler compiler = new Compiler(names, host, across);
    Node root = compiler.node(tree, array);
    return new Program(
        Rounded.of(tree, root),
        compiler.cells,
        compiler.ranges,
        compiler.drawing,
        compiler.pointing,
        array);
  }

  /**
   * @param array whether operators in it work on whole ranges
   */
  Node node(Expr tree, boolean array) {
    if (tree instanceof Expr.Num number) {
      return new Constant(new Value.Num(number.value()));
    } else if (tree instanceof Expr.Str text) {
      return new Constant(new Value.Text(text.value()));
    } else if (tree instanceof Expr.Bool truth) {
      return new Constant(new Value.Logical(truth.value()));
    } else if (tree instanceof Expr.ErrorLiteral error) {
      return new Constant(new Value.Fault(error.code()));
    } else if (tree instanceof Expr.Missing) {
      return new MissingNode();
    } else if (tree instanceof Expr.Paren paren) {
      return node(paren.inner(), array);
    } else if (tree instanceof Expr.ArrayLiteral literal) {
      return new Constant(literal(literal));
    }
    return operation(tree, array);
  }

  private Node operation(Expr tree, boolean array) {
    if (tree instanceof Expr.Unary unary) {
      return unary(unary, array);
    } else if (tree instanceof Expr.Binary binary) {
      return binary(binary, array);
    } else if (tree instanceof Expr.Call call) {
      return calls.call(call, array);
    } else if (tree instanceof Expr.NameRef name) {
      return name(name, array);
    } else if (tree instanceof Expr.SpillRef spill) {
      return new SpillNode(node(spill.anchor(), array), array);
    }
    return reference(tree, array);
  }

  private Value literal(Expr.ArrayLiteral literal) {
    Value[][] rows = new Value[literal.rows().size()][];
    for (int r = 0; r < rows.length; r++) {
      List<Expr> row = literal.rows().get(r);
      rows[r] = row.stream().map(e -> node(e, false).value(null)).toArray(Value[]::new);
    }
    return new Value.Array(rows);
  }

  private Node unary(Expr.Unary unary, boolean array) {
    UnaryOp op = unary.op();
    Node operand = node(unary.operand(), array && op != UnaryOp.AT);
    return switch (op) {
      case PLUS -> operand;
      case MINUS -> Signed.minus(operand);
      case PERCENT -> Signed.percent(operand);
      case AT -> new SingleNode(operand);
    };
  }

  private Node binary(Expr.Binary binary, boolean array) {
    BinaryOp op = binary.op();
    Node left = node(binary.left(), array);
    Node right = node(binary.right(), array);
    return switch (op) {
      case ADD -> new Arithmetic.Add(left, right);
      case SUBTRACT -> new Arithmetic.Subtract(left, right);
      case MULTIPLY -> new Arithmetic.Multiply(left, right);
      case DIVIDE -> new Arithmetic.Divide(left, right);
      case POWER -> new Arithmetic.Power(left, right);
      case CONCATENATE -> new Concatenation(left, right);
      case UNION, INTERSECTION, RANGE -> joined(op, left, right, array);
      default -> new Comparison(op, left, right);
    };
  }

  /** What lies between two computed ends is known only when it runs. */
  private Node joined(BinaryOp op, Node left, Node right, boolean array) {
    pointing |= op == BinaryOp.RANGE;
    return new JoinedReference(op, left, right, array);
  }

  private Node name(Expr.NameRef name, boolean array) {
    Integer local = name.sheet() == null ? calls.local(name.name()) : null;
    if (local != null) {
      return new LocalNode(local, array);
    }
    Expr meaning = meaning(name);
    if (meaning == null) {
      return reference(name, array);
    }
    if (namesOpen.contains(name.name()) || namesOpen.size() > DEEPEST_NAME) {
      throw new UnsupportedFormulaException("name defined by itself");
    }
    namesOpen.push(name.name());
    // a formula under a name works on whole ranges; a plain reference is taken as its user does
    boolean plain = plainReference(meaning);
    Node node = node(meaning, array || !plain);
    namesOpen.pop();
    return plain || array ? node : new FirstNode(node);
  }

  Expr meaning(Expr.NameRef name) {
    return names.find(name.name(), references.scope(name));
  }

  private Node reference(Expr tree, boolean array) {
    try {
      List<Footprint> footprints = references.of(tree);
      if (footprints == null) {
        return new Constant(new Value.Fault("#NAME?"));
      }
      return reference(footprints, array);
    } catch (FaultException e) {
      return new Constant(e.value());
    }
  }

  private Node reference(List<Footprint> footprints, boolean array) {
    Footprint only = footprints.get(0);
    if (unread || footprints.size() > 1 || !only.single()) {
      if (!unread) {
        ranges.addAll(footprints);
      }
      return new AreaNode(footprints, array);
    }
    int read = cells.indexOf(only);
    if (read < 0) {
      read = cells.size();
      cells.add(only);
    }
    boolean along = across ? !only.column1().absolute() : !only.row1().absolute();
    return CellNode.of(read, only, along);
  }

  /** An argument whose reference matters but not the cells behind it. */
  Node unread(Expr tree, boolean array) {
    unread = plainReference(tree);
    Node node = node(tree, array);
    unread = false;
    return node;
  }

  private boolean plainReference(Expr tree) {
    try {
      return references.of(tree) != null;
    } catch (FaultException e) {
      return false;
    }
  }
}
