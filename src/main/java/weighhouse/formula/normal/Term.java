package weighhouse.formula.normal;

import java.util.Collections;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/** A product: a coefficient times atoms with exponents. */
public final class Term {
  private final Coefficient coefficient;
  private final SortedMap<Atom, Poly> factors;
  private final String key;

  /**
   * @param factors atoms to exponents, none of which is zero
   */
  Term(Coefficient coefficient, SortedMap<Atom, Poly> factors) {
    this.coefficient = coefficient;
    this.factors = Collections.unmodifiableSortedMap(new TreeMap<>(factors));
    StringBuilder text = new StringBuilder();
    for (Map.Entry<Atom, Poly> factor : factors.entrySet()) {
      text.append('*').append(factor.getKey().key());
      if (!factor.getValue().isOne()) {
        text.append("^[").append(factor.getValue().key()).append(']');
      }
    }
    key = text.toString();
  }

  public Coefficient coefficient() {
    return coefficient;
  }

  /** Atoms to their exponents, in the order of keys. */
  public SortedMap<Atom, Poly> factors() {
    return factors;
  }

  /** The same for terms that differ in their coefficient only. */
  public String key() {
    return key;
  }

  public boolean isConstant() {
    return factors.isEmpty();
  }

  Term withCoefficient(Coefficient other) {
    return new Term(other, factors);
  }
}
