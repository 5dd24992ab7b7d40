package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.term.Identity;
import weighhouse.rules.term.Term;
import weighhouse.rules.term.Terms;

/** A formula in which metavariables stand for certain parts, held against patterns. */
final class Reading {
  private final FormulaView view;
  private final Map<String, Bound> bounds;
  private final IdentityHashMap<Expr, Term> given = new IdentityHashMap<>();
  private final IdentityHashMap<Expr, Term> changed;
  private final BitSet operands = new BitSet();
  private final Points points;

  Reading(FormulaView view, Map<String, Bound> bounds) {
    this.view = view;
    this.bounds = bounds;
    Terms terms = view.terms();
    Term one = terms.number(1);
    for (Bound bound : bounds.values()) {
      operands.set(bound.term().id());
      given.putAll(bound.given(one, term -> terms.power(term, terms.number(-1))));
    }
    this.changed = given.isEmpty() ? null : view.with(given);
    this.points = new Points(bounds, terms.all().size());
  }

  FormulaView view() {
    return view;
  }

  Points points() {
    return points;
  }

  boolean binds(String name) {
    return bounds.containsKey(name);
  }

  Bound bound(String name) {
    return bounds.get(name);
  }

  Term term(Expr node) {
    return changed == null ? view.term(node) : changed.get(node);
  }

  boolean holdsAllOperands() {
    BitSet missing = (BitSet) operands.clone();
    missing.andNot(term(view.tree()).below());
    return missing.isEmpty();
  }

  /** Whether a node depends on an operand. */
  boolean depends(Expr node) {
    Term term = term(node);
    return term != null && term.containsAny(operands);
  }

  /** Whether the node is one of several that an operand takes together. */
  boolean isTaken(Expr node) {
    return given.containsKey(node);
  }

  /** The nodes that are the pattern's function while none of their parts is. */
  List<Expr> smallest(Pattern pattern) {
    double[] values = points.pattern(pattern);
    Set<Expr> covered = PatternFinder.identitySet();
    List<Expr> smallest = new ArrayList<>();
    for (Expr node : view.nodes()) {
      if (Trees.children(node).stream().anyMatch(covered::contains)) {
        covered.add(node);
      } else if (depends(node) && is(node, pattern, values)) {
        covered.add(node);
        smallest.add(node);
      }
    }
    return smallest;
  }

  /** Whether some node is the pattern's function, the other being what it may stand in. */
  boolean holdsSomewhere(Pattern pattern, Pattern inner) {
    double[] values = points.pattern(pattern);
    boolean distinct = !Identity.affine(points.pattern(inner), values);
    return view.nodes().stream()
        .filter(this::depends)
        .map(this::term)
        .anyMatch(
            term ->
                points.equal(term, List.of(), List.of(), values)
                    || (distinct && points.holds(term, values)));
  }

  private boolean is(Expr node, Pattern pattern, double[] values) {
    return pattern.isSum()
        ? points.equal(term(node), free(node), List.of(), values)
        : points.holds(term(node), values);
  }

  /** Addends of a sum, numbers aside, that have nothing to do with the operands. */
  private List<Term> free(Expr node) {
    List<Term> free = new ArrayList<>();
    for (Chains.Addend addend : Chains.addends(node)) {
      Term term = term(addend.node());
      if (term != null && !term.isNumber() && !depends(addend.node())) {
        free.add(addend.negative() ? view.terms().negative(term) : term);
      }
    }
    return free;
  }

  /** Whether the formula as a whole is the pattern's function times what does not vary with it. */
  boolean isWhole(Pattern pattern) {
    double[] values = points.pattern(pattern);
    Expr root = Trees.inside(view.tree());
    List<Term> kept = new ArrayList<>();
    for (Factor factor : Chains.factors(root)) {
      if (!depends(factor.node()) && !isTaken(factor.node())) {
        kept.add(factor(factor));
      }
    }
    return points.equal(term(root), pattern.isSum() ? free(root) : List.of(), kept, values);
  }

  /**
   * Whether the node depends on a probability or rate inside an operand in some other way too, so
   * that the operand is not what the formula is about.
   */
  boolean leaks(Expr node) {
    return leaks(term(node));
  }

  private boolean leaks(Term term) {
    if (operands.get(term.id())) {
      return false;
    }
    if (term.parts().isEmpty()) {
      return bounds.values().stream().anyMatch(bound -> bound.term().contains(term))
          && view.isEvent(term);
    }
    return term.parts().stream().anyMatch(this::leaks);
  }

  /** The term by which a factor multiplies. */
  Term factor(Factor factor) {
    Terms terms = view.terms();
    Term term = factor.isSign() ? terms.number(-1) : term(factor.node());
    return factor.inverse() ? terms.power(term, terms.number(-1)) : term;
  }

  /** Whether the node puts the operands together itself, rather than refer to a cell that does. */
  boolean isMadeHere(Expr node) {
    return !Trees.children(node).isEmpty()
        || bounds.values().stream().anyMatch(bound -> bound.term().equals(term(node)));
  }
}
