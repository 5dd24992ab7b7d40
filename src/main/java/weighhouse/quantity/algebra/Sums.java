package weighhouse.quantity.algebra;

import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;

/** What sums and differences of terms amount to. */
final class Sums {
  private Sums() {}

  static Term add(Term a, Term b) {
    if (a.literal() && b.literal()) {
      return Term.number(a.value() + b.value());
    } else if (a.literal()) {
      return addNumber(b, a);
    } else if (b.literal()) {
      return addNumber(a, b);
    } else if (b.is(Form.NEGATIVE) && !a.is(Form.NEGATIVE)) {
      return subtract(a, b.negated());
    } else if (a.is(Form.NEGATIVE) && !b.is(Form.NEGATIVE)) {
      return subtract(b, a.negated());
    }
    return joined(a, b);
  }

  private static Term addNumber(Term term, Term number) {
    if (number.isOne() && term.is(Form.PLAIN)) {
      boolean kept = term.in(Kinds.TIMES) || term.in(Kinds.RESULTS);
      return kept ? term.moved() : term.as(Form.ONE_PLUS);
    } else if (number.isOne() && term.is(Form.NEGATIVE)) {
      return complement(term.negated());
    } else if (number.value() == -1 && term.is(Form.ONE_PLUS)) {
      return term.as(Form.PLAIN);
    }
    return term.moved();
  }

  static Term subtract(Term a, Term b) {
    if (a.literal() && b.literal()) {
      return Term.number(a.value() - b.value());
    } else if (a.isOne()) {
      return complement(b);
    } else if (a.literal()) {
      return a.value() == 0 ? b.negated() : b.moved();
    } else if (b.literal()) {
      return a.is(Form.COMPLEMENT) ? a : a.moved();
    } else if (a.is(Kind.SURVIVAL) && b.is(Kind.SURVIVAL)) {
      return Term.of(Kind.PROBABILITY);
    } else if (a.is(Kind.NET_BENEFIT) || (a.is(Kind.QALY) && b.is(Kind.COST))) {
      return Term.of(Kind.NET_BENEFIT);
    }
    return joined(a, b);
  }

  /** One minus the term. */
  private static Term complement(Term term) {
    if (term.is(Form.DECAY)) {
      return Term.of(Kind.PROBABILITY, term.span());
    } else if (term.is(Form.COMPLEMENT)) {
      return term.as(Form.PLAIN);
    } else if (term.is(Kind.SURVIVAL)) {
      return term.as(Kind.PROBABILITY);
    } else if (term.in(Kinds.RATIOS)) {
      return term.as(Kinds.reductionOf(term.kind()));
    } else if (term.in(Kinds.REDUCTIONS)) {
      return term.as(Kinds.ratioOfReduction(term.kind()));
    } else if (term.is(Kind.PROPORTION) || term.is(Kind.OCCUPANCY) || term.is(Kind.UTILITY)) {
      return term.moved();
    }
    return term.is(Form.PLAIN) ? term.as(Form.COMPLEMENT) : Term.UNKNOWN;
  }

  /** Terms that stand side by side: of one kind, or one that takes the others in. */
  private static Term joined(Term a, Term b) {
    Span span = Spans.common(a.span(), b.span());
    if (a.kind() == b.kind()) {
      Form form = a.is(b.form()) || a.is(Form.COMPLEMENT) ? a.form() : Form.PLAIN;
      return withRole(new Term(a.quantity(), form, Double.NaN, false).over(span), a, b);
    }
    Term host = takes(a, b) ? a : takes(b, a) ? b : Term.UNKNOWN;
    return host.over(host.isUnknown() ? null : host.span()).moved();
  }

  private static boolean takes(Term a, Term b) {
    return switch (a.kind()) {
      case COST, QALY, LIFE_YEARS, OCCUPANCY, NET_BENEFIT, TIME, AGE -> true;
      case CUMULATIVE_HAZARD -> b.is(Kind.RATE) || b.is(Kind.PROBABILITY);
      case RATE -> b.is(Kind.PROBABILITY);
      case SURVIVAL -> b.is(Kind.PROBABILITY);
      case COEFFICIENT -> Kinds.LOGS.contains(b.kind()) || b.isUnknown();
      case LOG_HAZARD_RATIO, LOG_RATE_RATIO, LOG_RISK_RATIO, LOG_ODDS_RATIO ->
          b.quantity().role() == Role.STANDARD_ERROR || b.is(Kind.STANDARD_ERROR) || b.isUnknown();
      case HAZARD_RATIO, RATE_RATIO, RISK_RATIO, ODDS_RATIO, MORTALITY_RATIO, RELATIVE_EFFECT ->
          b.is(Kind.STANDARD_ERROR);
      default -> false;
    };
  }

  private static Term withRole(Term sum, Term a, Term b) {
    Role role =
        a.quantity().role() == Role.STANDARD_ERROR ? b.quantity().role() : a.quantity().role();
    return new Term(new Quantity(sum.kind(), role, sum.span()), sum.form(), Double.NaN, false);
  }
}
