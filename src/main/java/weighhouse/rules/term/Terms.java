package weighhouse.rules.term;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Makes terms and keeps one of each. Not for use by several threads. */
public final class Terms {
  private record Key(Operation operation, List<Integer> parts, double number, Object symbol) {}

  private final Map<Key, Term> made = new HashMap<>();
  private final List<Term> inOrder = new ArrayList<>();

  /** All terms so far; the index is the id. */
  public List<Term> all() {
    return inOrder;
  }

  public Term number(double value) {
    return make(Operation.NUMBER, List.of(), value + 0.0, null);
  }

  public Term symbol(Object symbol) {
    return make(Operation.SYMBOL, List.of(), 0, symbol);
  }

  public Term sum(Term a, Term b) {
    if (a.isNumber() && b.isNumber()) {
      return number(a.number() + b.number());
    }
    return isNumber(a, 0) ? b : isNumber(b, 0) ? a : commuting(Operation.SUM, a, b);
  }

  public Term negative(Term a) {
    return product(number(-1), a);
  }

  public Term difference(Term a, Term b) {
    return sum(a, negative(b));
  }

  public Term product(Term a, Term b) {
    if (a.isNumber() && b.isNumber()) {
      return number(a.number() * b.number());
    }
    return isNumber(a, 1) ? b : isNumber(b, 1) ? a : commuting(Operation.PRODUCT, a, b);
  }

  public Term quotient(Term a, Term b) {
    return product(a, power(b, number(-1)));
  }

  public Term power(Term base, Term exponent) {
    if (isNumber(exponent, 1)) {
      return base;
    }
    if (base.isNumber() && exponent.isNumber()) {
      return number(Math.pow(base.number(), exponent.number()));
    }
    if (base.operation() == Operation.POWER
        && isNumber(base.parts().get(1), -1)
        && isNumber(exponent, -1)) {
      return base.parts().get(0);
    }
    return make(Operation.POWER, List.of(base, exponent), 0, null);
  }

  public Term exp(Term a) {
    return a.operation() == Operation.LN ? a.parts().get(0) : function(Operation.EXP, a);
  }

  public Term ln(Term a) {
    return a.operation() == Operation.EXP ? a.parts().get(0) : function(Operation.LN, a);
  }

  /** A term of any other operation. */
  public Term apply(Operation operation, List<Term> parts) {
    return make(operation, parts, 0, null);
  }

  /** A function of its parts of which nothing is known but its name. */
  public Term opaque(String name, List<Term> parts) {
    return make(Operation.OPAQUE, parts, 0, name);
  }

  private Term function(Operation operation, Term a) {
    if (a.isNumber()) {
      double value = operation == Operation.EXP ? Math.exp(a.number()) : Math.log(a.number());
      return number(value);
    }
    return make(operation, List.of(a), 0, null);
  }

  private Term commuting(Operation operation, Term a, Term b) {
    List<Term> parts = new ArrayList<>(List.of(a, b));
    parts.sort(Comparator.comparingInt(Term::id));
    return make(operation, parts, 0, null);
  }

  private Term make(Operation operation, List<Term> parts, double number, Object symbol) {
    Key key = new Key(operation, parts.stream().map(Term::id).toList(), number, symbol);
    Term known = made.get(key);
    if (known == null) {
      known = new Term(inOrder.size(), operation, parts, number, symbol);
      made.put(key, known);
      inOrder.add(known);
    }
    return known;
  }

  private static boolean isNumber(Term term, double value) {
    return term.isNumber() && term.number() == value;
  }
}
