package weighhouse.rules.term;

import java.util.List;
import weighhouse.formula.Expr;

/** Distribution functions of survival times that are plain algebra of their arguments. */
final class Distributions {
  private Distributions() {}

  /**
   * {@code 1-EXP(-(x/b)^a)}, the probability of an event by a time, of a Weibull or exponential.
   */
  static Term of(Expr.Call call, Translator translator) {
    List<Term> parts = call.arguments().stream().map(translator::of).toList();
    Terms terms = translator.terms();
    boolean weibull = call.function().startsWith("WEIBULL");
    boolean cumulative =
        parts.size() == (weibull ? 4 : 3)
            && parts.get(parts.size() - 1).isNumber()
            && parts.get(parts.size() - 1).number() != 0;
    if (!cumulative) {
      return terms.opaque(call.function(), parts);
    }
    Term time = parts.get(0);
    Term hazard =
        weibull
            ? terms.power(terms.quotient(time, parts.get(2)), parts.get(1))
            : terms.product(time, parts.get(1));
    return terms.difference(terms.number(1), terms.exp(terms.negative(hazard)));
  }
}
