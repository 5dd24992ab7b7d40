package weighhouse.quantity.algebra;

import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;
import weighhouse.quantity.TimeUnit;

/** What products of terms amount to. */
final class Products {
  private Products() {}

  static Term multiply(Term a, Term b) {
    if (a.is(Form.NEGATIVE)) {
      return multiply(a.negated(), b).negated();
    } else if (b.is(Form.NEGATIVE)) {
      return multiply(a, b.negated()).negated();
    } else if (a.literal() && b.literal()) {
      return Term.number(a.value() * b.value());
    } else if (a.literal()) {
      return scaled(b, a);
    } else if (b.literal()) {
      return scaled(a, b);
    }
    Term product = ordered(a, b);
    return product != null ? product : orElse(ordered(b, a), constant(a, b));
  }

  private static Term orElse(Term product, Term other) {
    return product == null ? other : product;
  }

  /** Unknown constants multiply to a constant: {@code 1/B3*B4} in an exponent. */
  private static Term constant(Term a, Term b) {
    return new Term(Term.UNKNOWN.quantity(), Form.PLAIN, a.value() * b.value(), false);
  }

  /** A term times a number written in the formula. */
  static Term scaled(Term term, Term number) {
    double value = number.value();
    if (value < 0) {
      return scaled(term, Term.number(-value)).negated();
    }
    double conversion = Spans.conversion(number);
    Span span = term.span();
    if (term.is(Kind.RATE) || term.is(Kind.CUMULATIVE_HAZARD)) {
      return term.moved().over(rateSpan(span, value, conversion));
    } else if (term.is(Kind.CYCLE_LENGTH) || term.is(Kind.TIME)) {
      return new Term(term.quantity(), term.form(), term.value() * value, false);
    } else if (term.isUnknown() && term.is(Form.PLAIN)) {
      return new Term(term.quantity(), term.form(), term.value() * value, false);
    }
    return Double.isNaN(conversion) || !term.is(Kind.PROBABILITY)
        ? term.moved()
        : term.moved().over(Spans.times(span, value));
  }

  /** A rate per 1000 people divided by 1000 is one per person; one per year by 12, per month. */
  private static Span rateSpan(Span span, double value, double conversion) {
    if (span == null) {
      return null;
    }
    boolean perPerson = span.people() > 1 && Math.abs(value * span.people() - 1) < 1e-9;
    if (perPerson) {
      return new Span(span.amount(), span.unit(), 1);
    }
    return Double.isNaN(conversion) ? span : Spans.times(span, value);
  }

  /** The product where a is what decides; null where it is not. */
  private static Term ordered(Term a, Term b) {
    return switch (a.kind()) {
      case COST -> b.is(Kind.THRESHOLD) ? null : Term.of(Kind.COST, a.span());
      case QALY -> Term.of(b.is(Kind.THRESHOLD) ? Kind.NET_BENEFIT : Kind.QALY);
      case LIFE_YEARS -> Term.of(b.is(Kind.UTILITY) ? Kind.QALY : Kind.LIFE_YEARS);
      case NET_BENEFIT, ICER -> a.moved();
      case UTILITY -> utility(b);
      case RATE -> rate(a, b);
      case CURVE_RATE -> curveRate(a, b);
      case OCCUPANCY -> occupancy(b);
      case PROBABILITY, SURVIVAL, CUMULATIVE_HAZARD, ODDS -> risk(a, b);
      case PROPORTION -> b.isUnknown() || b.in(Kinds.TIMES) ? null : b.moved();
      case CYCLE_LENGTH -> b.is(Kind.COUNT) || b.is(Kind.TIME) ? Term.of(Kind.TIME) : null;
      case DISCOUNT_FACTOR -> b.isUnknown() ? Term.UNKNOWN : b.moved();
      case DISCOUNT_RATE -> b.in(Kinds.TIMES) || b.isUnknown() ? a.moved() : null;
      case STANDARD_ERROR -> b.isUnknown() ? a.moved() : null;
      default -> effects(a, b);
    };
  }

  private static Term utility(Term b) {
    boolean lived =
        b.in(Kinds.TIMES) || b.is(Kind.OCCUPANCY) || b.is(Kind.SURVIVAL) || b.is(Kind.LIFE_YEARS);
    return Term.of(lived ? Kind.QALY : Kind.UTILITY);
  }

  private static Term rate(Term a, Term b) {
    if (b.in(Kinds.TIMES) || b.is(Kind.CYCLES_PER_YEAR)) {
      Span span = b.is(Kind.CYCLE_LENGTH) ? Spans.perCycle(a.span()) : null;
      return Term.of(Kind.CUMULATIVE_HAZARD, span);
    } else if (b.is(Kind.OCCUPANCY)) {
      return b.moved();
    } else if (b.in(Kinds.RATIOS) || b.in(Kinds.REDUCTIONS) || b.in(Kinds.LOGS)) {
      return a.moved();
    } else if (b.isUnknown() && !Double.isNaN(Spans.conversion(b))) {
      return a.moved().over(Spans.times(a.span(), b.value()));
    }
    return b.is(Kind.PROBABILITY) || b.is(Kind.RATE) || b.is(Kind.PROPORTION) ? a.moved() : null;
  }

  private static Term curveRate(Term a, Term b) {
    return b.in(Kinds.TIMES) || b.is(Kind.CURVE_SHAPE) || b.isUnknown()
        ? Term.of(Kind.CUMULATIVE_HAZARD)
        : b.in(Kinds.RATIOS) ? a.moved() : null;
  }

  private static Term occupancy(Term b) {
    if (b.is(Kind.TIME) || b.is(Kind.CYCLE_LENGTH)) {
      return Term.of(Kind.LIFE_YEARS);
    }
    return b.in(Kinds.RESULTS) || b.is(Kind.UTILITY) ? null : Term.of(Kind.OCCUPANCY);
  }

  private static Term risk(Term a, Term b) {
    if (b.is(Kind.OCCUPANCY) || b.in(Kinds.RESULTS) || b.is(Kind.UTILITY) || b.is(Kind.RATE)) {
      return null;
    } else if (a.is(Kind.PROBABILITY) && b.is(Kind.PROBABILITY)) {
      boolean stays = a.is(Form.COMPLEMENT) && b.is(Form.COMPLEMENT);
      return Term.of(Kind.PROBABILITY, Spans.common(a.span(), b.span()))
          .as(stays ? Form.COMPLEMENT : Form.PLAIN);
    } else if (a.is(Kind.SURVIVAL) && b.is(Kind.PROBABILITY)) {
      return b.is(Form.COMPLEMENT) ? a.moved() : Term.of(Kind.PROBABILITY);
    } else if (a.is(Kind.SURVIVAL) && b.is(Kind.SURVIVAL)) {
      return a.moved();
    } else if (b.in(Kinds.RATIOS) || b.in(Kinds.REDUCTIONS) || b.in(Kinds.LOGS)) {
      return a.moved();
    } else if (b.in(Kinds.TIMES) || b.is(Kind.CYCLES_PER_YEAR)) {
      Span span = b.is(Kind.CYCLE_LENGTH) ? Spans.perCycle(a.span()) : null;
      return a.moved().over(span);
    } else if (b.isUnknown() && !Double.isNaN(Spans.conversion(b))) {
      return a.moved().over(Spans.times(a.span(), b.value()));
    }
    return b.is(Kind.PROPORTION) || b.is(Kind.ODDS) ? a.moved() : null;
  }

  private static Term effects(Term a, Term b) {
    if (a.in(Kinds.RATIOS)) {
      return ratio(a, b);
    } else if (a.in(Kinds.REDUCTIONS)) {
      return b.isUnknown() ? null : a.moved();
    } else if (a.in(Kinds.LOGS)) {
      return a.is(Kind.COEFFICIENT) || b.isUnknown() || b.in(Kinds.TIMES) ? a.moved() : null;
    } else if (a.is(Kind.CURVE_SCALE) || a.is(Kind.CURVE_SHAPE)) {
      return b.in(Kinds.RATIOS) ? a.moved() : null;
    }
    return null;
  }

  private static Term ratio(Term a, Term b) {
    if (b.in(Kinds.RATIOS)) {
      return a.kind() == b.kind() ? a.moved() : Term.of(Kind.RELATIVE_EFFECT);
    } else if (b.is(Kind.SURVIVAL_TIME) || b.in(Kinds.REDUCTIONS)) {
      return b.moved();
    }
    return null;
  }

  /** Whether a span is the model's own cycle. */
  static boolean isCycle(Span span) {
    return span != null && span.unit() == TimeUnit.CYCLE;
  }
}
