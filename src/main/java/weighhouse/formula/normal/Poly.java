package weighhouse.formula.normal;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;

/** A sum of products in canonical order. Equal sums are equal objects; immutable. */
public final class Poly {
  public static final Poly ZERO = new Poly(List.of());
  public static final Poly ONE = constant(Coefficient.ONE);

  private final List<Term> terms;
  private final String key;

  private Poly(List<Term> terms) {
    this.terms = terms;
    key =
        terms.stream()
            .map(term -> term.coefficient() + term.key())
            .collect(Collectors.joining("+"));
  }

  /** A sum of terms of which no two have the same factors; zero ones are left out. */
  static Poly ofDistinct(Collection<Term> terms) {
    return new Poly(
        terms.stream()
            .filter(term -> !term.coefficient().isZero())
            .sorted(Comparator.comparing(Term::key))
            .toList());
  }

  public static Poly constant(Coefficient value) {
    return ofDistinct(List.of(new Term(value, new TreeMap<>())));
  }

  public static Poly of(Atom atom) {
    return of(Coefficient.ONE, new TreeMap<>(java.util.Map.of(atom, ONE)));
  }

  static Poly of(Coefficient coefficient, SortedMap<Atom, Poly> factors) {
    return ofDistinct(List.of(new Term(coefficient, factors)));
  }

  static Poly of(Term term) {
    return ofDistinct(List.of(term));
  }

  /** The terms in the order of their keys, a constant first; none for zero. */
  public List<Term> terms() {
    return terms;
  }

  /** A text that is the same for equal sums only. */
  public String key() {
    return key;
  }

  /** The value of a sum without atoms. */
  public Optional<Coefficient> constant() {
    if (terms.isEmpty()) {
      return Optional.of(Coefficient.ZERO);
    }
    return terms.size() == 1 && terms.get(0).isConstant()
        ? Optional.of(terms.get(0).coefficient())
        : Optional.empty();
  }

  public boolean isOne() {
    return constant().filter(Coefficient::isOne).isPresent();
  }

  public boolean isZero() {
    return terms.isEmpty();
  }

  /** The only term, if there is one only. */
  public Optional<Term> single() {
    return terms.size() == 1 ? Optional.of(terms.get(0)) : Optional.empty();
  }

  /** The atom, if this is nothing but one. */
  public Optional<Atom> atom() {
    return single()
        .filter(term -> term.coefficient().isOne() && term.factors().size() == 1)
        .filter(term -> term.factors().get(term.factors().firstKey()).isOne())
        .map(term -> term.factors().firstKey());
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Poly poly && poly.key.equals(key);
  }

  @Override
  public int hashCode() {
    return key.hashCode();
  }

  @Override
  public String toString() {
    return key;
  }
}
