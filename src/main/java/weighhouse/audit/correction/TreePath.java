package weighhouse.audit.correction;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;

/**
 * The way from a tree's root to one of its nodes, by position of the child at each step; finds the
 * corresponding node in another tree of the same form.
 *
 * @param steps zero-based child positions, empty for the root
 */
public record TreePath(List<Integer> steps) {

  /** The way to that very node; empty where the tree does not hold it. */
  public static Optional<TreePath> to(Expr tree, Expr node) {
    Deque<Integer> steps = new ArrayDeque<>();
    return find(tree, node, steps)
        ? Optional.of(new TreePath(new ArrayList<>(steps)))
        : Optional.empty();
  }

  @SuppressWarnings("ReferenceEquality") // equal nodes may stand in several places
  private static boolean find(Expr tree, Expr node, Deque<Integer> steps) {
    if (tree == node) {
      return true;
    }
    List<Expr> children = Trees.children(tree);
    for (int i = 0; i < children.size(); i++) {
      steps.addLast(i);
      if (find(children.get(i), node, steps)) {
        return true;
      }
      steps.removeLast();
    }
    return false;
  }

  /** The node at the end of the way; empty where the tree has another form. */
  public Optional<Expr> in(Expr tree) {
    Expr node = tree;
    for (int step : steps) {
      List<Expr> children = Trees.children(node);
      if (step >= children.size()) {
        return Optional.empty();
      }
      node = children.get(step);
    }
    return Optional.of(node);
  }
}
