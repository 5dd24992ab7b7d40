package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;

/** Finds normal and log-normal draws in formulas. */
public final class Draws {
  private static final Set<String> NORMAL = Set.of("NORM.INV", "NORMINV");
  private static final Set<String> LOG_NORMAL = Set.of("LOGNORM.INV", "LOGINV");
  private static final Set<String> STANDARD = Set.of("NORM.S.INV", "NORMSINV");
  private static final Set<String> EXP = Set.of("EXP");

  private final ModelView model;

  public Draws(ModelView model) {
    this.model = model;
  }

  /** Whether the formula can hold a draw at all. */
  public static boolean mayDraw(Expr tree) {
    return Trees.contains(
        tree,
        node ->
            node instanceof Expr.Call call
                && (NORMAL.contains(call.function())
                    || LOG_NORMAL.contains(call.function())
                    || STANDARD.contains(call.function())));
  }

  /** The draws of a formula, the outermost form of each; quantiles at a typed-in level are none. */
  public List<Draw> in(Place place) {
    Set<Expr> covered = Collections.newSetFromMap(new IdentityHashMap<>());
    List<Draw> draws = new ArrayList<>();
    for (Expr node : Trees.walk(place.tree())) {
      if (!covered.contains(node)) {
        draw(node, place.host())
            .ifPresent(
                draw -> {
                  covered.addAll(Trees.walk(node));
                  draws.add(draw);
                });
      }
    }
    return draws;
  }

  private Optional<Draw> draw(Expr node, CellAddress host) {
    if (Parts.calls(node, LOG_NORMAL, 3)) {
      return ofCall(node, true);
    } else if (Parts.calls(node, EXP, 1)) {
      return normal(Parts.argument(node, 0), host)
          .map(d -> new Draw(node, true, d.level(), d.standard(), d.location(), d.spread()));
    }
    return normal(node, host);
  }

  private Optional<Draw> normal(Expr node, CellAddress host) {
    if (Parts.calls(node, NORMAL, 3)) {
      return ofCall(node, false);
    } else if (Parts.is(node, BinaryOp.ADD) || Parts.is(node, BinaryOp.SUBTRACT)) {
      Optional<Draw> right = sum(node, Parts.left(node), Parts.right(node), host);
      return right.isPresent() || Parts.is(node, BinaryOp.SUBTRACT)
          ? right
          : sum(node, Parts.right(node), Parts.left(node), host);
    }
    return Optional.empty();
  }

  private static Optional<Draw> ofCall(Expr node, boolean logNormal) {
    Expr level = Parts.argument(node, 0);
    return Parts.isConstant(level)
        ? Optional.empty()
        : Optional.of(
            new Draw(
                node, logNormal, level, null, Parts.argument(node, 1), Parts.argument(node, 2)));
  }

  /** {@code location + spread * z}. */
  private Optional<Draw> sum(Expr node, Expr location, Expr varying, CellAddress host) {
    if (!Parts.is(varying, BinaryOp.MULTIPLY)) {
      return Optional.empty();
    }
    Expr left = Parts.left(varying);
    Expr right = Parts.right(varying);
    if (isStandard(right, host)) {
      return Optional.of(new Draw(node, false, null, right, location, left));
    }
    return isStandard(left, host)
        ? Optional.of(new Draw(node, false, null, left, location, right))
        : Optional.empty();
  }

  private boolean isStandard(Expr node, CellAddress host) {
    if (Parts.calls(node, STANDARD, 1)) {
      return !Parts.isConstant(Parts.argument(node, 0));
    }
    CellAddress cell = model.cell(node, host);
    Expr formula = cell == null ? null : model.formula(cell);
    return formula != null && Parts.calls(formula, STANDARD, 1);
  }
}
