package weighhouse.rules.pattern;

import java.util.EnumSet;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.rules.term.Identity;
import weighhouse.rules.term.Operation;
import weighhouse.rules.term.Sample;
import weighhouse.rules.term.Term;

/**
 * Recognises a ratio that was faded, shared out or switched: whatever is 1 when the ratio is 1,
 * with everything else as it may be, is that ratio still. {@code 1-(1-HR)*w}, {@code HR^w}, {@code
 * IF(on,HR,1)} and {@code EXP(w*LN(HR))} are examples.
 */
final class FadedRatios {
  static final Set<Kind> RATIOS =
      EnumSet.of(
          Kind.HAZARD_RATIO,
          Kind.RATE_RATIO,
          Kind.RISK_RATIO,
          Kind.ODDS_RATIO,
          Kind.MORTALITY_RATIO,
          Kind.TIME_RATIO,
          Kind.RELATIVE_EFFECT);

  private static final int SAMPLES = 4;

  private final FormulaView view;

  FadedRatios(FormulaView view) {
    this.view = view;
  }

  /** The quantity told, unless nothing is told and the term is a faded ratio. */
  Quantity orElse(Term term, Quantity told) {
    if (RATIOS.contains(told.kind()) && isStretch(term)) {
      return Quantity.of(Kind.TIME_RATIO);
    }
    if (told.kind() != Kind.UNKNOWN || term.parts().isEmpty() || isAnotherMeasure(term)) {
      return told;
    }
    for (Term part : view.readTerms()) {
      if (part != term
          && part.parts().isEmpty()
          && term.contains(part)
          && RATIOS.contains(view.quantity(part).kind())
          && isOneWith(term, part)) {
        return view.quantity(part);
      }
    }
    return told;
  }

  /** A ratio of hazards to a power of a curve's shape stretches time. */
  private boolean isStretch(Term term) {
    if (term.operation() != Operation.POWER) {
      return false;
    }
    Term exponent = term.parts().get(1);
    for (Term part : view.readTerms()) {
      if (exponent.contains(part) && view.quantity(part).kind() == Kind.CURVE_SHAPE) {
        return true;
      }
    }
    return false;
  }

  /**
   * A ratio that depends on the baseline (odds made into risks) or on a curve (hazards made into
   * times) is another measure.
   */
  private boolean isAnotherMeasure(Term term) {
    for (Term part : view.readTerms()) {
      boolean telling = view.isEvent(part) || view.quantity(part).kind() == Kind.CURVE_SHAPE;
      if (part.parts().isEmpty() && term.contains(part) && telling) {
        return true;
      }
    }
    return false;
  }

  private static boolean isOneWith(Term term, Term ratio) {
    boolean moves = false;
    for (int seed = 1; seed <= SAMPLES; seed++) {
      int size = term.id() + 1;
      if (!Identity.agree(new Sample(seed, size).with(ratio, 1).of(term), 1)) {
        return false;
      }
      moves |= !Identity.agree(new Sample(seed, size).with(ratio, 0.5).of(term), 1);
    }
    return moves;
  }
}
