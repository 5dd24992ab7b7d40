package weighhouse.formula.normal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/** Calculates with sums of products at one {@link Level}. */
public final class Arithmetic {
  /** Multiplying out stops where it would give more terms than this. */
  static final int MAX_TERMS = 64;

  private static final Atom EULER = new Atom.Euler();
  private static final Coefficient TWO = Coefficient.of(2);
  private static final double LARGEST_EXPANDED_POWER = 4;
  private static final double LARGEST_CALCULATED_POWER = 8;

  private final Level level;

  public Arithmetic(Level level) {
    this.level = level;
  }

  public Poly add(Poly a, Poly b) {
    Map<String, Term> sum = new LinkedHashMap<>();
    addTo(sum, a, Coefficient.ONE);
    addTo(sum, b, Coefficient.ONE);
    return Poly.ofDistinct(sum.values());
  }

  public Poly subtract(Poly a, Poly b) {
    Map<String, Term> sum = new LinkedHashMap<>();
    addTo(sum, a, Coefficient.ONE);
    addTo(sum, b, Coefficient.MINUS_ONE);
    return Poly.ofDistinct(sum.values());
  }

  public Poly negate(Poly a) {
    return subtract(Poly.ZERO, a);
  }

  private static void addTo(Map<String, Term> sum, Poly poly, Coefficient sign) {
    for (Term term : poly.terms()) {
      Coefficient coefficient = term.coefficient().times(sign);
      Optional<Poly> inner = loneSum(term);
      if (inner.isPresent() && coefficient.abs().isOne()) {
        addTo(sum, inner.get(), coefficient);
      } else {
        sum.merge(
            term.key(),
            term.withCoefficient(coefficient),
            (x, y) -> x.withCoefficient(x.coefficient().plus(y.coefficient())));
      }
    }
  }

  /** The sum, if a term is nothing but one that was kept together. */
  private static Optional<Poly> loneSum(Term term) {
    return Poly.of(term.withCoefficient(Coefficient.ONE))
        .atom()
        .filter(Atom.Sum.class::isInstance)
        .map(atom -> ((Atom.Sum) atom).sum());
  }

  public Poly multiply(Poly a, Poly b) {
    int terms = a.terms().size() * b.terms().size();
    boolean plain = terms <= 1 || isUnit(a) || isUnit(b);
    if (plain || (level == Level.EXPANDED && terms <= MAX_TERMS)) {
      return distributed(a, b);
    }
    return flattened(multiply(together(a).terms().get(0), together(b).terms().get(0)));
  }

  /** Takes a lone sum apart again. */
  private Poly flattened(Poly poly) {
    return add(Poly.ZERO, poly);
  }

  /** When expanded, multiplies out sums that became plain factors. */
  private Poly opened(Poly poly) {
    if (level == Level.AS_WRITTEN) {
      return flattened(poly);
    }
    Poly result = Poly.ZERO;
    for (Term term : poly.terms()) {
      Optional<Atom.Sum> sum = plainSum(term);
      if (sum.isPresent() && sum.get().sum().terms().size() <= MAX_TERMS) {
        SortedMap<Atom, Poly> others = new TreeMap<>(term.factors());
        others.remove(sum.get());
        Poly rest = Poly.of(term.coefficient(), others);
        result = add(result, distributed(rest, sum.get().sum()));
      } else {
        result = add(result, Poly.of(term));
      }
    }
    return result;
  }

  private static Optional<Atom.Sum> plainSum(Term term) {
    return term.factors().entrySet().stream()
        .filter(factor -> factor.getKey() instanceof Atom.Sum && factor.getValue().isOne())
        .map(factor -> (Atom.Sum) factor.getKey())
        .findFirst();
  }

  private static boolean isUnit(Poly poly) {
    return poly.constant().filter(value -> value.abs().isOne()).isPresent();
  }

  private Poly distributed(Poly a, Poly b) {
    Poly sum = Poly.ZERO;
    for (Term left : a.terms()) {
      for (Term right : b.terms()) {
        sum = add(sum, opened(multiply(left, right)));
      }
    }
    return sum;
  }

  private Poly multiply(Term a, Term b) {
    SortedMap<Atom, Poly> factors = new TreeMap<>(a.factors());
    Coefficient coefficient = a.coefficient().times(b.coefficient());
    for (Map.Entry<Atom, Poly> factor : b.factors().entrySet()) {
      Atom atom = factor.getKey();
      Poly before = factors.getOrDefault(atom, Poly.ZERO);
      Poly exponent = add(before, factor.getValue());
      Optional<Coefficient> number = number(atom, exponent);
      if (number.isPresent()) {
        factors.remove(atom);
        coefficient = coefficient.times(number.get());
      } else {
        factors.put(atom, exponent);
      }
    }
    return Poly.of(coefficient, factors);
  }

  /** The value of a factor that is but a number. */
  private static Optional<Coefficient> number(Atom base, Poly exponent) {
    if (exponent.isZero()) {
      return Optional.of(Coefficient.ONE);
    }
    return base instanceof Atom.Constant constant
        ? smallPower(constant.value(), exponent)
        : Optional.empty();
  }

  /** A sum of several terms as one factor, its sign and what its terms share in front. */
  Poly together(Poly poly) {
    if (poly.terms().size() < 2) {
      return poly;
    }
    CommonContent content = CommonContent.of(poly, level);
    Poly rest = content.rest();
    Poly inner = rest.terms().size() < 2 ? rest : Poly.of(new Atom.Sum(rest));
    return multiply(content.content(), inner.terms().get(0));
  }

  /**
   * A result, an argument or an exponent in its final form: at level EXPANDED what all terms share
   * stands in front.
   */
  public Poly finish(Poly poly) {
    if (level == Level.AS_WRITTEN || poly.terms().size() < 2) {
      return poly;
    }
    CommonContent content = CommonContent.of(poly, level);
    boolean onlySign =
        content.content().isConstant() && content.content().coefficient().abs().isOne();
    return onlySign ? poly : together(poly);
  }

  public Poly divide(Poly a, Poly b) {
    return multiply(a, power(b, Poly.constant(Coefficient.MINUS_ONE)));
  }

  public Poly power(Poly base, Poly written) {
    Poly exponent = opened(written);
    if (exponent.isZero() || base.isOne()) {
      return Poly.ONE;
    } else if (exponent.isOne()) {
      return base;
    }
    Optional<Coefficient> number = base.constant();
    Optional<Coefficient> times = exponent.constant();
    if (number.isPresent()) {
      return factor(new Atom.Constant(number.get()), exponent);
    } else if (times.filter(this::isMultipliedOut).isPresent() && base.terms().size() > 1) {
      return multiply(base, power(base, Poly.constant(times.get().plus(Coefficient.MINUS_ONE))));
    }
    Poly together = together(base);
    return together.single().isPresent() && !isSum(together)
        ? power(together.single().get(), exponent)
        : factor(new Atom.Sum(base), exponent);
  }

  /** Small whole powers of numbers are calculated, others stay exact. */
  private static Optional<Coefficient> smallPower(Coefficient base, Poly exponent) {
    return exponent
        .constant()
        .filter(Coefficient::isInteger)
        .filter(times -> Math.abs(times.value()) <= LARGEST_CALCULATED_POWER)
        .filter(times -> !(base.isZero() && times.isNegative()))
        .map(times -> base.power((int) times.value()));
  }

  private boolean isMultipliedOut(Coefficient exponent) {
    return level == Level.EXPANDED
        && exponent.isInteger()
        && exponent.value() >= TWO.value()
        && exponent.value() <= LARGEST_EXPANDED_POWER;
  }

  private static boolean isSum(Poly poly) {
    return poly.atom().filter(Atom.Sum.class::isInstance).isPresent();
  }

  /** (c*x^a*y^b)^e, as for positive numbers. */
  private Poly power(Term base, Poly exponent) {
    boolean whole = exponent.constant().filter(Coefficient::isInteger).isPresent();
    if (base.coefficient().isNegative() && !whole) {
      return factor(new Atom.Sum(Poly.of(base)), exponent);
    }
    Poly result = power(Poly.constant(base.coefficient()), exponent);
    for (Map.Entry<Atom, Poly> factor : base.factors().entrySet()) {
      Poly product = opened(multiply(factor.getValue(), exponent));
      result = multiply(result, factor(factor.getKey(), product));
    }
    return result;
  }

  private static Poly factor(Atom atom, Poly exponent) {
    return number(atom, exponent)
        .map(Poly::constant)
        .orElseGet(() -> Poly.of(Coefficient.ONE, new TreeMap<>(Map.of(atom, exponent))));
  }

  /** e to a power; logarithms in the exponent become powers: EXP(a+b*LN(x)) = EXP(a)*x^b. */
  public Poly exp(Poly exponent) {
    Poly result = Poly.ONE;
    List<Term> rest = new ArrayList<>();
    for (Term term : exponent.terms()) {
      Optional<Atom.Function> logarithm = logarithm(term);
      if (logarithm.isPresent()) {
        SortedMap<Atom, Poly> others = new TreeMap<>(term.factors());
        others.remove(logarithm.get());
        Poly power = Poly.of(term.coefficient(), others);
        result = multiply(result, power(logarithm.get().arguments().get(0), power));
      } else {
        rest.add(term);
      }
    }
    Poly left = opened(Poly.ofDistinct(rest));
    return left.isZero() ? result : multiply(result, factor(EULER, left));
  }

  private static Optional<Atom.Function> logarithm(Term term) {
    return term.factors().entrySet().stream()
        .filter(factor -> factor.getValue().isOne())
        .map(Map.Entry::getKey)
        .filter(atom -> atom instanceof Atom.Function f && f.name().equals("LN"))
        .map(Atom.Function.class::cast)
        .findFirst();
  }

  /** The natural logarithm; of products the sum, of powers the product. */
  public Poly ln(Poly argument) {
    if (argument.isOne()) {
      return Poly.ZERO;
    }
    Poly together = together(argument);
    Optional<Term> product = together.single().filter(term -> term.coefficient().value() > 0);
    if (product.isEmpty() || argument.constant().isPresent() || isSum(together)) {
      return Poly.of(new Atom.Function("LN", List.of(finish(argument))));
    }
    Poly sum = ln(Poly.constant(product.get().coefficient()));
    for (Map.Entry<Atom, Poly> factor : product.get().factors().entrySet()) {
      sum = add(sum, multiply(factor.getValue(), lnOfAtom(factor.getKey())));
    }
    return sum;
  }

  private Poly lnOfAtom(Atom atom) {
    if (atom instanceof Atom.Euler) {
      return Poly.ONE;
    } else if (atom instanceof Atom.Constant constant) {
      return ln(Poly.constant(constant.value()));
    }
    Poly argument = atom instanceof Atom.Sum sum ? sum.sum() : Poly.of(atom);
    return Poly.of(new Atom.Function("LN", List.of(argument)));
  }
}
