package weighhouse.quantity.algebra;

import weighhouse.quantity.Kind;
import weighhouse.quantity.Span;

/** What powers, exponentials and logarithms of terms amount to. */
final class Powers {
  private Powers() {}

  static Term power(Term base, Term exponent) {
    if (base.literal() && exponent.literal()) {
      return Term.number(Math.pow(base.value(), exponent.value()));
    } else if (base.is(Form.ONE_PLUS)) {
      return growth(base);
    } else if (base.is(Kind.PROBABILITY) || base.is(Kind.SURVIVAL)) {
      return base.moved().over(span(base.span(), exponent));
    } else if (base.is(Form.DECAY) || (base.isUnknown() && base.is(Form.COMPLEMENT))) {
      return base.as(base.form());
    } else if (base.is(Kind.CURVE_RATE)) {
      return Term.of(Kind.CUMULATIVE_HAZARD);
    } else if (base.in(Kinds.TIMES)) {
      return Term.of(Kind.TIME);
    }
    return base.in(Kinds.RATIOS) ? base.moved() : Term.UNKNOWN;
  }

  /** {@code (1+r)^t}: the inverse of a discount factor, if r discounts. */
  private static Term growth(Term base) {
    return switch (base.kind()) {
      case DISCOUNT_RATE -> Term.of(Kind.DISCOUNT_FACTOR);
      case OTHER_RATE -> Term.of(Kind.OTHER_RATIO);
      default -> Term.UNKNOWN;
    };
  }

  private static Span span(Span span, Term exponent) {
    if (exponent.in(Kinds.RATIOS)) {
      return span;
    } else if (exponent.is(Kind.CYCLE_LENGTH)) {
      return Spans.perCycle(span);
    }
    return Double.isNaN(exponent.value()) ? null : Spans.times(span, exponent.value());
  }

  static Term exp(Term term) {
    if (term.in(Kinds.LOGS)) {
      return term.as(Kinds.ratioOf(term.kind())).as(Form.PLAIN);
    } else if (term.is(Kind.DISCOUNT_RATE)) {
      return Term.of(Kind.DISCOUNT_FACTOR);
    } else if (term.is(Kind.CUMULATIVE_HAZARD) || term.is(Kind.RATE) || term.is(Kind.PROBABILITY)) {
      return Term.of(Kind.SURVIVAL, term.span());
    } else if (term.is(Form.NEGATIVE)) {
      return Term.UNKNOWN.as(Form.DECAY);
    }
    return term.literal() ? Term.number(Math.exp(term.value())) : Term.UNKNOWN;
  }

  static Term ln(Term term) {
    if (term.literal()) {
      return Term.number(Math.log(term.value()));
    } else if (term.in(Kinds.RATIOS)) {
      return term.as(Kinds.logOf(term.kind()));
    } else if (term.is(Kind.SURVIVAL) || (term.is(Kind.PROBABILITY) && term.is(Form.COMPLEMENT))) {
      return Term.of(Kind.CUMULATIVE_HAZARD, term.span()).as(Form.NEGATIVE);
    } else if (term.is(Form.DECAY)) {
      return Term.UNKNOWN;
    }
    return term.is(Kind.ODDS) ? Term.of(Kind.COEFFICIENT) : Term.UNKNOWN;
  }
}
