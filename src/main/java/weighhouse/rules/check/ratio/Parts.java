package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;

/** Takes formulas apart. */
public final class Parts {
  /** Functions that hand on one of their arguments, with where those start. */
  private static final Set<String> KEEPING =
      Set.of("ROUND", "ROUNDUP", "ROUNDDOWN", "IFERROR", "IFNA", "MIN", "MAX", "ABS", "N");

  private static final Set<String> SELECTING = Set.of("IF", "CHOOSE");

  private Parts() {}

  /** One operand of a sum; a negative one is subtracted. */
  public record Addend(Expr node, boolean negative) {}

  /** What a cell can show: the formula without rounding, bounds and the choice between cases. */
  public static List<Expr> results(Expr tree) {
    List<Expr> results = new ArrayList<>();
    collect(tree, results);
    return results;
  }

  private static void collect(Expr node, List<Expr> results) {
    Expr inside = Trees.inside(node);
    if (inside instanceof Expr.Call call && KEEPING.contains(call.function())) {
      boolean one = call.function().startsWith("ROUND") || call.arguments().size() == 1;
      List<Expr> kept = one ? call.arguments().subList(0, 1) : call.arguments();
      kept.forEach(argument -> collect(argument, results));
    } else if (inside instanceof Expr.Call call && SELECTING.contains(call.function())) {
      call.arguments().stream().skip(1).forEach(argument -> collect(argument, results));
    } else {
      results.add(inside);
    }
  }

  /** The addends of a sum from left to right; of anything else, the node alone. */
  public static List<Addend> addends(Expr node) {
    List<Addend> addends = new ArrayList<>();
    addends(node, false, addends);
    return addends;
  }

  private static void addends(Expr node, boolean negative, List<Addend> addends) {
    Expr inside = Trees.inside(node);
    if (inside instanceof Expr.Binary sum && sum.op() == BinaryOp.ADD) {
      addends(sum.left(), negative, addends);
      addends(sum.right(), negative, addends);
    } else if (inside instanceof Expr.Binary sum && sum.op() == BinaryOp.SUBTRACT) {
      addends(sum.left(), negative, addends);
      addends(sum.right(), !negative, addends);
    } else if (inside instanceof Expr.Unary sign && sign.op() == UnaryOp.MINUS) {
      addends(sign.operand(), !negative, addends);
    } else {
      addends.add(new Addend(inside, negative));
    }
  }

  /** The factors of a product of two or more; of anything else, the node alone. */
  public static List<Expr> factors(Expr node) {
    Expr inside = Trees.inside(node);
    if (inside instanceof Expr.Binary product && product.op() == BinaryOp.MULTIPLY) {
      List<Expr> factors = new ArrayList<>(factors(product.left()));
      factors.addAll(factors(product.right()));
      return factors;
    }
    return List.of(inside);
  }

  /** Whether the node is that operation. */
  public static boolean is(Expr node, BinaryOp op) {
    return Trees.inside(node) instanceof Expr.Binary binary && binary.op() == op;
  }

  public static Expr left(Expr node) {
    return Trees.inside(((Expr.Binary) Trees.inside(node)).left());
  }

  public static Expr right(Expr node) {
    return Trees.inside(((Expr.Binary) Trees.inside(node)).right());
  }

  /** Whether the node calls one of these functions with so many arguments. */
  public static boolean calls(Expr node, Set<String> functions, int arguments) {
    return Trees.inside(node) instanceof Expr.Call call
        && functions.contains(call.function())
        && call.arguments().size() == arguments;
  }

  public static Expr argument(Expr call, int index) {
    return Trees.inside(((Expr.Call) Trees.inside(call)).arguments().get(index));
  }

  /** Whether the value depends on no cell and on no chance. */
  public static boolean isConstant(Expr node) {
    return !Trees.contains(node, part -> refers(part) || isRandom(part));
  }

  /** Whether the node itself is a reference or name. */
  public static boolean refers(Expr node) {
    return node instanceof Expr.CellRef
        || node instanceof Expr.AreaRef
        || node instanceof Expr.NameRef
        || node instanceof Expr.ColumnsRef
        || node instanceof Expr.RowsRef
        || node instanceof Expr.TableRef
        || node instanceof Expr.SpillRef;
  }

  private static boolean isRandom(Expr node) {
    return node instanceof Expr.Call call && call.function().startsWith("RAND");
  }

  /** Whether a random number is drawn somewhere in the formula. */
  public static boolean draws(Expr tree) {
    return Trees.contains(tree, Parts::isRandom);
  }
}
