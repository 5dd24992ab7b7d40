package weighhouse.rules.pattern;

import java.util.IdentityHashMap;
import java.util.List;
import java.util.function.UnaryOperator;
import weighhouse.formula.Expr;
import weighhouse.quantity.Quantity;
import weighhouse.rules.term.Term;

/**
 * What a metavariable stands for in a formula: a term wherever it occurs, or several factors of one
 * product taken together.
 *
 * @param term the term, or a symbol that stands for the product of the factors
 * @param wrapping how the metavariable's value follows from the term's
 * @param operand the metavariable as an expression for the host
 * @param quantities what the term or each factor means
 * @param factors the factors' own nodes, empty for a term
 */
public record Bound(
    Term term, Wrapping wrapping, Expr operand, List<Quantity> quantities, List<Factor> factors) {

  /** The nodes that stand for other terms than their own while this is bound. */
  IdentityHashMap<Expr, Term> given(Term one, UnaryOperator<Term> inverse) {
    IdentityHashMap<Expr, Term> given = new IdentityHashMap<>();
    for (int i = 0; i < factors.size(); i++) {
      Term first = factors.get(0).inverse() ? inverse.apply(term) : term;
      given.put(factors.get(i).node(), i == 0 ? first : one);
    }
    return given;
  }
}
