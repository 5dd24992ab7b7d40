package weighhouse.formula;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.function.UnaryOperator;

/** What all work on trees has in common: children, walks, rebuilding. */
public final class Trees {
  private Trees() {}

  /** The direct parts of a node, from left to right. */
  public static List<Expr> children(Expr node) {
    if (node instanceof Expr.Binary binary) {
      return List.of(binary.left(), binary.right());
    } else if (node instanceof Expr.Unary unary) {
      return List.of(unary.operand());
    } else if (node instanceof Expr.Paren paren) {
      return List.of(paren.inner());
    } else if (node instanceof Expr.Call call) {
      return call.arguments();
    } else if (node instanceof Expr.SpillRef spill) {
      return List.of(spill.anchor());
    } else if (node instanceof Expr.ArrayLiteral array) {
      return array.rows().stream().flatMap(List::stream).toList();
    }
    return List.of();
  }

  /** The node with other parts, as many as {@link #children} gives. */
  public static Expr withChildren(Expr node, List<Expr> children) {
    if (node instanceof Expr.Binary binary) {
      return new Expr.Binary(binary.op(), children.get(0), children.get(1));
    } else if (node instanceof Expr.Unary unary) {
      return new Expr.Unary(unary.op(), children.get(0));
    } else if (node instanceof Expr.Paren) {
      return new Expr.Paren(children.get(0));
    } else if (node instanceof Expr.Call call) {
      return new Expr.Call(call.function(), children);
    } else if (node instanceof Expr.SpillRef) {
      return new Expr.SpillRef(children.get(0));
    } else if (node instanceof Expr.ArrayLiteral array) {
      List<List<Expr>> rows = new ArrayList<>();
      int from = 0;
      for (List<Expr> row : array.rows()) {
        rows.add(children.subList(from, from + row.size()));
        from += row.size();
      }
      return new Expr.ArrayLiteral(rows);
    }
    return node;
  }

  /** Every node, a parent before its children, from left to right. */
  public static List<Expr> walk(Expr tree) {
    List<Expr> nodes = new ArrayList<>();
    Deque<Expr> waiting = new ArrayDeque<>();
    waiting.push(tree);
    while (!waiting.isEmpty()) {
      Expr node = waiting.pop();
      nodes.add(node);
      List<Expr> children = children(node);
      for (int i = children.size() - 1; i >= 0; i--) {
        waiting.push(children.get(i));
      }
    }
    return nodes;
  }

  public static boolean contains(Expr tree, Predicate<Expr> condition) {
    return walk(tree).stream().anyMatch(condition);
  }

  public static int count(Expr tree, Predicate<Expr> condition) {
    return (int) walk(tree).stream().filter(condition).count();
  }

  /**
   * Rebuilds a tree from the leaves up: {@code change} sees each node with its parts already
   * changed. Parts that stay the same are the same objects.
   */
  public static Expr map(Expr tree, UnaryOperator<Expr> change) {
    return rebuild(tree, node -> null, change);
  }

  /** The tree with one very node replaced, found by identity. */
  @SuppressWarnings("ReferenceEquality") // equal nodes may stand in several places
  public static Expr replace(Expr tree, Expr old, Expr replacement) {
    return rebuild(tree, node -> node == old ? replacement : null, UnaryOperator.identity());
  }

  /**
   * Rebuilds a tree from the top down: where {@code replacement} gives a node, it stands for the
   * whole part; where it gives null, the parts are looked at.
   */
  public static Expr replaceAll(Expr tree, Function<Expr, Expr> replacement) {
    return rebuild(tree, replacement, UnaryOperator.identity());
  }

  /** The tree without any parentheses of its own; the printer adds those that are needed. */
  public static Expr withoutParens(Expr tree) {
    return map(tree, node -> node instanceof Expr.Paren paren ? paren.inner() : node);
  }

  /** The node inside any parentheses around it. */
  public static Expr inside(Expr node) {
    Expr inner = node;
    while (inner instanceof Expr.Paren paren) {
      inner = paren.inner();
    }
    return inner;
  }

  /** Both directions in one loop over an explicit stack, for trees thousands of levels deep. */
  private static Expr rebuild(Expr tree, Function<Expr, Expr> down, UnaryOperator<Expr> up) {
    Deque<Rebuilding> open = new ArrayDeque<>();
    Rebuilding root = new Rebuilding(new Expr.Paren(tree));
    open.push(root);
    while (true) {
      Rebuilding top = open.peek();
      if (!top.isDone()) {
        Expr next = top.next();
        Expr replaced = down.apply(next);
        if (replaced != null) {
          top.add(replaced);
        } else {
          open.push(new Rebuilding(next));
        }
      } else if (top == root) {
        return root.changed.get(0);
      } else {
        open.pop();
        open.peek().add(up.apply(top.result()));
      }
    }
  }

  /** A node whose parts are being rebuilt. */
  private static final class Rebuilding {
    private final Expr node;
    private final List<Expr> children;
    private final List<Expr> changed = new ArrayList<>(2);
    private boolean same = true;

    Rebuilding(Expr node) {
      this.node = node;
      this.children = children(node);
    }

    boolean isDone() {
      return changed.size() == children.size();
    }

    Expr next() {
      return children.get(changed.size());
    }

    @SuppressWarnings("ReferenceEquality") // keeps what did not change
    void add(Expr child) {
      same &= child == next();
      changed.add(child);
    }

    Expr result() {
      return same ? node : withChildren(node, changed);
    }
  }
}
