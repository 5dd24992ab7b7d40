package weighhouse.formula.normal;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What all terms of a sum share, and what is left of them: the sign of the first term and, when
 * expanded, the largest number and the factors that all have.
 *
 * @param content what stands in front
 * @param rest the sum without it
 */
record CommonContent(Term content, Poly rest) {

  static CommonContent of(Poly sum, Level level) {
    List<Term> terms = sum.terms();
    SortedMap<Atom, Poly> shared =
        level == Level.EXPANDED ? shared(terms) : new TreeMap<Atom, Poly>();
    Coefficient number =
        level == Level.EXPANDED
            ? terms.stream().map(Term::coefficient).reduce(Coefficient::common).get().abs()
            : Coefficient.ONE;
    Poly rest = without(terms, number, shared);
    if (rest.terms().get(0).coefficient().isNegative()) {
      number = number.negated();
      rest = without(terms, number, shared);
    }
    return new CommonContent(new Term(number, shared), rest);
  }

  private static Poly without(List<Term> terms, Coefficient number, SortedMap<Atom, Poly> shared) {
    return Poly.ofDistinct(terms.stream().map(term -> without(term, number, shared)).toList());
  }

  private static Term without(Term term, Coefficient number, SortedMap<Atom, Poly> shared) {
    SortedMap<Atom, Poly> factors = new TreeMap<>(term.factors());
    Arithmetic exact = new Arithmetic(Level.EXPANDED);
    for (Map.Entry<Atom, Poly> factor : shared.entrySet()) {
      Poly left = exact.subtract(factors.get(factor.getKey()), factor.getValue());
      if (left.isZero()) {
        factors.remove(factor.getKey());
      } else {
        factors.put(factor.getKey(), left);
      }
    }
    return new Term(term.coefficient().times(number.inverse()), factors);
  }

  private static SortedMap<Atom, Poly> shared(List<Term> terms) {
    SortedMap<Atom, Poly> shared = new TreeMap<>(terms.get(0).factors());
    for (Term term : terms.subList(1, terms.size())) {
      SortedMap<Atom, Poly> left = new TreeMap<>();
      shared.forEach(
          (atom, exponent) -> {
            Poly common = common(exponent, term.factors().get(atom));
            if (common != null) {
              left.put(atom, common);
            }
          });
      shared = left;
    }
    return shared;
  }

  /** The exponent nearer to zero of two with the same sign; equal symbolic ones; otherwise null. */
  private static Poly common(Poly a, Poly b) {
    if (b == null || a.equals(b)) {
      return b;
    }
    if (a.constant().isEmpty() || b.constant().isEmpty()) {
      return null;
    }
    double x = a.constant().get().value();
    double y = b.constant().get().value();
    if (x * y < 0) {
      return null;
    }
    return Math.abs(x) < Math.abs(y) ? a : b;
  }
}
