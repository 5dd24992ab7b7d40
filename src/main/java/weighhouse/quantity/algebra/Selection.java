package weighhouse.quantity.algebra;

import java.util.List;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;

/** What one of several terms is, whichever is selected. */
final class Selection {
  private Selection() {}

  /** What the known terms have in common; numbers and texts fit everything. */
  static Term of(List<Term> terms) {
    Term common = null;
    boolean drawn = !terms.isEmpty();
    for (Term term : terms) {
      drawn &= term.quantity().role() == Role.DRAW || term.literal();
      if (!term.literal() && !term.isUnknown()) {
        common = common == null ? term : meet(common, term);
      }
    }
    if (common == null) {
      return drawn ? Term.UNKNOWN.as(Role.DRAW) : Term.UNKNOWN;
    }
    return common.moved().as(drawn ? Role.DRAW : role(common));
  }

  private static Role role(Term common) {
    Role role = common.quantity().role();
    return role == Role.DRAW ? Role.ESTIMATE : role;
  }

  private static Term meet(Term a, Term b) {
    if (a.kind() == b.kind()) {
      Form form = a.is(b.form()) ? a.form() : Form.PLAIN;
      Role role = a.quantity().role() == b.quantity().role() ? a.quantity().role() : Role.ESTIMATE;
      return new Term(
          new Quantity(a.kind(), role, Spans.common(a.span(), b.span())), form, Double.NaN, false);
    } else if (a.in(Kinds.RATIOS) && b.in(Kinds.RATIOS)) {
      return Term.of(Kind.RELATIVE_EFFECT);
    }
    boolean risks = a.in(Kinds.RISKS) && b.in(Kinds.RISKS);
    boolean certain = a.is(Kind.PROBABILITY) || b.is(Kind.PROBABILITY);
    return risks && certain ? Term.of(Kind.PROBABILITY) : Term.UNKNOWN;
  }
}
