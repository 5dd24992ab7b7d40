package weighhouse.quantity.algebra;

import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;

/**
 * What a part of a formula amounts to.
 *
 * @param quantity what it means
 * @param form how it is held
 * @param value its number where it is the same in every cell of the region, else NaN
 * @param literal whether it is written in the formula, so a mere number
 */
record Term(Quantity quantity, Form form, double value, boolean literal) {
  static final Term UNKNOWN = new Term(Quantity.UNKNOWN, Form.PLAIN, Double.NaN, false);

  static Term number(double value) {
    return new Term(Quantity.UNKNOWN, Form.PLAIN, value, true);
  }

  static Term of(Kind kind) {
    return of(kind, null);
  }

  static Term of(Kind kind, Span span) {
    return new Term(new Quantity(kind, Role.ESTIMATE, span), Form.PLAIN, Double.NaN, false);
  }

  static Term of(Quantity quantity) {
    return new Term(quantity, Form.PLAIN, Double.NaN, false);
  }

  Kind kind() {
    return quantity.kind();
  }

  Span span() {
    return quantity.span();
  }

  boolean is(Kind other) {
    return quantity.kind() == other;
  }

  boolean is(Form other) {
    return form == other;
  }

  boolean isUnknown() {
    return quantity.kind() == Kind.UNKNOWN && !literal;
  }

  boolean isOne() {
    return literal && value == 1;
  }

  boolean in(Set<Kind> kinds) {
    return kinds.contains(quantity.kind());
  }

  Term as(Form other) {
    return new Term(quantity, other, Double.NaN, literal && other == form);
  }

  Term as(Kind kind) {
    return new Term(new Quantity(kind, quantity.role(), quantity.span()), form, Double.NaN, false);
  }

  /** The same quantity without the number, as after arithmetic on it. */
  Term moved() {
    return new Term(quantity, form, Double.NaN, false);
  }

  Term over(Span span) {
    return new Term(new Quantity(quantity.kind(), quantity.role(), span), form, value, literal);
  }

  Term as(Role role) {
    return new Term(new Quantity(quantity.kind(), role, quantity.span()), form, value, literal);
  }

  Term negated() {
    double negative = -value;
    return switch (form) {
      case PLAIN -> new Term(quantity, literal ? Form.PLAIN : Form.NEGATIVE, negative, literal);
      case NEGATIVE -> new Term(quantity, Form.PLAIN, negative, literal);
      default -> this;
    };
  }
}
