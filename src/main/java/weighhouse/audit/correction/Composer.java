package weighhouse.audit.correction;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.recalculate.Change;
import weighhouse.workbook.CellRange;

/**
 * Makes one change of several corrections. Corrections of different ranges go side by side; two of
 * one formula are worked into one tree, the outer first, so that the inner finds its node again as
 * an operand of the outer's result.
 */
public final class Composer {
  private Composer() {}

  public static Change compose(List<Correction> corrections) {
    Map<CellRange, List<Correction>> byRange = new LinkedHashMap<>();
    for (Correction correction : corrections) {
      for (CellRange range : correction.cells()) {
        byRange.computeIfAbsent(range, r -> new ArrayList<>()).add(correction);
      }
    }
    Map<CellRange, Expr> formulas = new LinkedHashMap<>();
    byRange.forEach((range, all) -> formulas.put(range, combined(all)));
    return new Change(Map.of(), formulas);
  }

  private static Expr combined(List<Correction> all) {
    List<Correction> outerFirst = new ArrayList<>(all);
    outerFirst.sort(Comparator.comparingInt((Correction c) -> size(c.offending(), c)).reversed());
    Expr tree = outerFirst.get(0).corrected();
    for (Correction inner : outerFirst.subList(1, outerFirst.size())) {
      Expr node = inner.offending();
      if (node != null) {
        Expr replacement = replacement(inner);
        tree = Trees.replace(tree, node, replacement);
      }
    }
    return tree;
  }

  /** What stands in the place of the offending node in the inner correction alone. */
  private static Expr replacement(Correction inner) {
    return TreePath.to(inner.original(), inner.offending())
        .flatMap(path -> path.in(inner.corrected()))
        .orElse(inner.offending());
  }

  private static int size(Expr offending, Correction correction) {
    return Trees.count(offending == null ? correction.original() : offending, node -> true);
  }
}
