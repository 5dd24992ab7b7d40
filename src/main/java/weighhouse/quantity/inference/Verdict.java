package weighhouse.quantity.inference;

import weighhouse.quantity.Basis;
import weighhouse.quantity.Quantity;

/**
 * What a unit is taken for.
 *
 * @param quantity the quantity
 * @param source which evidence decided
 */
record Verdict(Quantity quantity, Source source) {
  static final Verdict NOTHING = new Verdict(Quantity.UNKNOWN, Source.NONE);

  /** Where a verdict comes from. */
  enum Source {
    DECLARATION(Basis.DECLARED),
    STRUCTURE(Basis.ALGEBRA),
    LABEL(Basis.LABEL),
    FORMULA(Basis.ALGEBRA),
    USAGE(Basis.ALGEBRA),
    NONE(Basis.NONE);

    private final Basis basis;

    Source(Basis basis) {
      this.basis = basis;
    }

    Basis basis() {
      return basis;
    }
  }
}
