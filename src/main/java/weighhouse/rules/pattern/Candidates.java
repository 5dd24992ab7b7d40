package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import weighhouse.formula.Expr;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.rules.term.Operation;
import weighhouse.rules.term.Term;

/** What a metavariable can stand for in one formula, the most telling first. */
final class Candidates {
  private final FormulaView view;

  Candidates(FormulaView view) {
    this.view = view;
  }

  List<Bound> of(Metavariable metavariable) {
    List<Bound> bounds = new ArrayList<>();
    if (metavariable.joins()) {
      joined(metavariable, bounds);
    }
    List<Term> terms = new ArrayList<>();
    Set<Term> grouped = groupedTerms(bounds);
    view.readTerms().forEach(terms::add);
    terms.removeIf(term -> !term.isNumber() && grouped.contains(term));
    terms.sort(
        Comparator.comparing((Term term) -> term.operation() == Operation.PRODUCT)
            .thenComparing(term -> !view.spells(term))
            .thenComparing(term -> -term.below().cardinality())
            .thenComparing(Term::id));
    for (Term term : terms) {
      Bound bound = bound(metavariable, term);
      if (bound != null) {
        bounds.add(bound);
      }
    }
    return bounds;
  }

  /** Factors that stand for the metavariable together: one of them alone would be half of it. */
  private Set<Term> groupedTerms(List<Bound> groups) {
    return groups.stream()
        .flatMap(group -> group.factors().stream())
        .map(factor -> view.term(factor.node()))
        .collect(Collectors.toSet());
  }

  private Bound bound(Metavariable metavariable, Term term) {
    Wrapping wrapping = wrapping(metavariable, term);
    if (wrapping == null) {
      return null;
    }
    Expr operand = wrapping.operand(view.expression(term));
    return new Bound(term, wrapping, operand, List.of(view.quantity(term)), List.of());
  }

  private Wrapping wrapping(Metavariable metavariable, Term term) {
    if (term.isNumber()) {
      return metavariable.takes(term.number()) ? Wrapping.NONE : null;
    }
    if (metavariable.kinds().isEmpty()) {
      return null;
    }
    Quantity quantity = view.quantity(term);
    if (metavariable.takes(quantity)) {
      return Wrapping.NONE;
    }
    return quantity.role() == Role.STANDARD_ERROR
        ? null
        : Reduced.toward(metavariable.kinds(), quantity.kind());
  }

  /** All factors of one product that the metavariable takes, as one. */
  private void joined(Metavariable metavariable, List<Bound> bounds) {
    for (Expr node : view.nodes()) {
      if (Chains.isProduct(node) && isTop(node)) {
        List<Factor> taken =
            Chains.factors(node).stream().filter(f -> takes(metavariable, f)).toList();
        if (isGroup(metavariable, taken)) {
          bounds.add(together(metavariable, taken));
        }
      }
    }
  }

  /**
   * One factor alone is a term; a lone divisor is a group where reciprocals count, as of numbers.
   */
  private static boolean isGroup(Metavariable metavariable, List<Factor> taken) {
    return taken.stream().anyMatch(factor -> !factor.inverse())
        ? taken.size() > 1
        : !taken.isEmpty() && !metavariable.numbers().isEmpty();
  }

  @SuppressWarnings("ReferenceEquality") // one very node
  private boolean isTop(Expr node) {
    return Chains.product(node, view) == node;
  }

  private boolean takes(Metavariable metavariable, Factor factor) {
    Term term = view.term(factor.node());
    return term != null // a sign has none
        && wrapping(metavariable, term) == Wrapping.NONE;
  }

  private Bound together(Metavariable metavariable, List<Factor> factors) {
    Term symbol = view.terms().symbol(List.of(metavariable.name(), factors));
    List<Quantity> quantities =
        factors.stream().map(factor -> view.quantity(view.term(factor.node()))).toList();
    return new Bound(symbol, Wrapping.NONE, Products.of(factors), quantities, factors);
  }
}
