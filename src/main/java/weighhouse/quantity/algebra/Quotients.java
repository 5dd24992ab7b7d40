package weighhouse.quantity.algebra;

import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;

/** What quotients of terms amount to. */
final class Quotients {
  private Quotients() {}

  /**
   * The quotient of two terms.
   *
   * @param part whether what is divided is itself part of the divisor: {@code a/(a+b)}
   */
  static Term divide(Term a, Term b, boolean part) {
    if (b.literal()) {
      return a.literal()
          ? Term.number(a.value() / b.value())
          : Products.multiply(a, Term.number(1 / b.value()));
    } else if (a.is(Form.NEGATIVE) || (a.literal() && a.value() < 0)) {
      return divide(a.negated(), b, part).negated();
    } else if (a.literal()) {
      return reciprocal(a, b);
    } else if (part && a.in(Kinds.RISKS)) {
      return a.is(Kind.PROBABILITY) && b.is(Kind.PROBABILITY)
          ? Term.of(Kind.PROBABILITY, a.span())
          : Term.of(a.is(Kind.ODDS) ? Kind.PROBABILITY : Kind.PROPORTION);
    }
    return known(a, b);
  }

  private static Term reciprocal(Term number, Term b) {
    double value = number.value() / b.value();
    Kind kind =
        switch (b.kind()) {
          case CYCLES_PER_YEAR -> Kind.CYCLE_LENGTH;
          case CYCLE_LENGTH -> Kind.CYCLES_PER_YEAR;
          case RATE -> Kind.SURVIVAL_TIME;
          case SURVIVAL_TIME -> Kind.RATE;
          case DISCOUNT_FACTOR -> Kind.DISCOUNT_FACTOR;
          default -> Kinds.RATIOS.contains(b.kind()) ? b.kind() : Kind.UNKNOWN;
        };
    Term term = Term.of(kind, null);
    return new Term(term.quantity(), Form.PLAIN, value, false);
  }

  private static Term known(Term a, Term b) {
    if (a.is(Kind.PROBABILITY) && b.is(Kind.PROBABILITY)) {
      return overProbability(a, b);
    } else if (b.is(Kind.CYCLES_PER_YEAR)) {
      return perCycle(a);
    } else if (a.is(Kind.COST)) {
      boolean effect = b.is(Kind.QALY) || b.is(Kind.LIFE_YEARS);
      return Term.of(effect ? Kind.ICER : b.is(Kind.COST) ? Kind.OTHER_RATIO : Kind.COST);
    } else if (a.is(Kind.ODDS) && b.is(Form.ONE_PLUS)) {
      return Term.of(Kind.PROBABILITY, a.span());
    } else if (b.is(Kind.DISCOUNT_FACTOR)) {
      return a.moved();
    } else if (a.is(Kind.PROBABILITY) && b.is(Kind.SURVIVAL)) {
      return a.moved();
    } else if (a.is(Kind.CUMULATIVE_HAZARD) && b.in(Kinds.TIMES)) {
      return Term.of(Kind.RATE);
    } else if (a.kind() == b.kind() && !a.isUnknown()) {
      return Term.of(Kinds.quotientOf(a.kind()));
    }
    return byFactor(a, b);
  }

  private static Term overProbability(Term a, Term b) {
    if (a.is(Form.PLAIN) && b.is(Form.COMPLEMENT)) {
      return Term.of(Kind.ODDS, a.span());
    }
    return Term.of(a.is(Form.PLAIN) ? Kind.RISK_RATIO : Kind.SURVIVAL);
  }

  /** A number for a year, divided by the cycles of a year. */
  private static Term perCycle(Term a) {
    boolean timed = a.is(Kind.RATE) || a.is(Kind.PROBABILITY) || a.is(Kind.CUMULATIVE_HAZARD);
    Span span = timed ? Spans.perCycle(a.span()) : null;
    return a.in(Kinds.TIMES) ? Term.of(Kind.TIME) : a.moved().over(span);
  }

  private static Term byFactor(Term a, Term b) {
    if (b.in(Kinds.RATIOS)) {
      return a.isUnknown() ? Term.UNKNOWN : a.moved();
    } else if (b.isUnknown() || b.in(Kinds.TIMES)) {
      double conversion = Spans.conversion(b);
      if (!Double.isNaN(conversion) && (a.in(Kinds.RISKS) || a.in(Kinds.TIMES))) {
        return Products.scaled(a, Term.number(1 / b.value()));
      }
      boolean survives = a.in(Kinds.RISKS) || a.in(Kinds.RESULTS) || a.is(Kind.UTILITY);
      return survives && b.in(Kinds.TIMES) ? a.moved().over(null) : constant(a, b);
    } else if (a.is(Kind.TIME) && b.is(Kind.CURVE_SCALE)) {
      return Term.of(Kind.CURVE_RATE);
    }
    return Term.UNKNOWN;
  }

  private static Term constant(Term a, Term b) {
    double value = a.isUnknown() || a.in(Kinds.TIMES) ? a.value() / b.value() : Double.NaN;
    return new Term(Term.UNKNOWN.quantity(), Form.PLAIN, value, false);
  }
}
