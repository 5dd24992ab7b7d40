package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;

/** Finds typed patterns in one formula, at the smallest parts in which their operands meet. */
public final class PatternFinder {
  private final FormulaView view;
  private final ToDoubleFunction<Expr> values;

  /**
   * @param values present value of an expression in the view's host, NaN where it has none
   */
  public PatternFinder(FormulaView view, ToDoubleFunction<Expr> values) {
    this.view = view;
    this.values = values;
  }

  /** Every place where the formula is the pattern. */
  public List<Found> find(TypedPattern typed) {
    List<Found> found = new ArrayList<>();
    if (typed.cell() != null && !CellCondition.holds(typed.cell(), view, values)) {
      return found;
    }
    new Bindings(typed, view)
        .forEach(
            bounds -> {
              Situation situation = new Situation(view, bounds, values);
              if (conditionsHold(typed, situation)) {
                search(typed, situation, found);
              }
            });
    return found;
  }

  private static boolean conditionsHold(TypedPattern typed, Situation situation) {
    return situation.bounds().entrySet().stream()
        .allMatch(
            entry ->
                typed.where().get(entry.getKey()).conditions().stream()
                    .allMatch(condition -> condition.holds(entry.getValue(), situation)));
  }

  private void search(TypedPattern typed, Situation situation, List<Found> found) {
    Reading reading = new Reading(view, situation.bounds());
    if (!reading.holdsAllOperands()) {
      return;
    }
    List<Expr> places = places(typed, reading);
    if (places.isEmpty() || excused(typed, reading)) {
      return;
    }
    for (Expr place : places) {
      Correction correction = new Correction(typed, reading);
      Site site = correction.site(place);
      boolean known = found.stream().anyMatch(other -> nested(other.offending(), site.node()));
      if (!known && site.kept().stream().noneMatch(node -> isBeside(typed, node))) {
        found.add(new Found(typed, operands(situation), site.node(), correction.apply(site)));
      }
    }
  }

  private boolean isBeside(TypedPattern typed, Factor factor) {
    return typed.beside().contains(kind(factor));
  }

  private Kind kind(Factor factor) {
    return factor.isSign() ? Kind.UNKNOWN : view.quantity(view.term(factor.node())).kind();
  }

  @SuppressWarnings("ReferenceEquality") // one very node
  private boolean nested(Expr a, Expr b) {
    return Trees.contains(a, node -> node == b) || Trees.contains(b, node -> node == a);
  }

  private static boolean excused(TypedPattern typed, Reading reading) {
    return typed.unless().stream()
        .anyMatch(
            pattern ->
                pattern.variables().stream().allMatch(reading::binds)
                    && reading.holdsSomewhere(pattern, typed.pattern()));
  }

  /** The smallest nodes that are the pattern's function, unless a helper cell was it already. */
  private List<Expr> places(TypedPattern typed, Reading reading) {
    if (typed.cell() != null) {
      return reading.isWhole(typed.pattern()) ? List.of(Trees.inside(view.tree())) : List.of();
    }
    return reading.smallest(typed.pattern()).stream()
        .filter(reading::isMadeHere)
        .filter(node -> !reading.leaks(node))
        .toList();
  }

  private static Map<String, Expr> operands(Situation situation) {
    Map<String, Expr> operands = new LinkedHashMap<>();
    situation.bounds().forEach((name, bound) -> operands.put(name, bound.operand()));
    return operands;
  }

  /** Nodes compared by identity. */
  static java.util.Set<Expr> identitySet() {
    return java.util.Collections.newSetFromMap(new IdentityHashMap<>());
  }
}
