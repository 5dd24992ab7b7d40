package weighhouse.quantity.inference;

import java.util.EnumSet;
import java.util.Set;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;
import weighhouse.quantity.algebra.Demand;
import weighhouse.quantity.inference.Verdict.Source;
import weighhouse.quantity.label.Guess;
import weighhouse.quantity.vocabulary.Strength;

/** Decides whom to believe about a unit: declaration, structure, label, formula or usage. */
final class Judge {
  /** Kinds that speak of a length of time. */
  private static final Set<Kind> TIMED =
      EnumSet.of(
          Kind.PROBABILITY,
          Kind.RATE,
          Kind.CUMULATIVE_HAZARD,
          Kind.SURVIVAL,
          Kind.ODDS,
          Kind.RISK_RATIO,
          Kind.ODDS_RATIO,
          Kind.RISK_REDUCTION,
          Kind.RELATIVE_EFFECT,
          Kind.TIME,
          Kind.SURVIVAL_TIME,
          Kind.CYCLE_LENGTH,
          Kind.DISCOUNT_RATE);

  private Judge() {}

  static Verdict of(Unit unit) {
    if (unit.declared != null) {
      return new Verdict(unit.declared, Source.DECLARATION);
    } else if (unit.guess.parameter() && unit.structural == Kind.UNKNOWN) {
      return Verdict.NOTHING;
    }
    Source source = source(unit);
    Kind kind = kind(unit, source);
    Role role = role(unit);
    Span span = TIMED.contains(kind) ? span(unit, kind, source) : null;
    return new Verdict(new Quantity(kind, role, span), source);
  }

  private static Source source(Unit unit) {
    Guess guess = unit.guess;
    boolean formula = unit.up.kind() != Kind.UNKNOWN;
    if (unit.structural == Kind.OCCUPANCY) {
      return Source.STRUCTURE;
    } else if (isDecisive(guess, formula)) {
      return Source.LABEL;
    } else if (unit.structural != Kind.UNKNOWN) {
      return Source.STRUCTURE;
    } else if (formula) {
      return Source.FORMULA;
    }
    boolean used = !unit.demands.isEmpty();
    boolean firm = used && unit.demands.get(0).firm();
    if (firm || (used && !guess.known())) {
      return Source.USAGE;
    }
    return guess.known() ? Source.LABEL : Source.NONE;
  }

  /**
   * A label of that very number, in words that mean it. A section's title gives way to a formula.
   */
  private static boolean isDecisive(Guess guess, boolean formula) {
    return guess.known(Strength.CLEAR) && !(formula && guess.remote());
  }

  private static Kind kind(Unit unit, Source source) {
    return switch (source) {
      case STRUCTURE -> unit.structural;
      case LABEL -> unit.guess.kind();
      case FORMULA -> unit.up.kind();
      case USAGE -> unit.demands.get(0).kind();
      default -> Kind.UNKNOWN;
    };
  }

  private static Role role(Unit unit) {
    if (unit.guess.role() != Role.ESTIMATE) {
      return unit.guess.role();
    }
    return unit.up.role();
  }

  private static Span span(Unit unit, Kind kind, Source source) {
    Span told = unit.guess.quantity().span();
    boolean formula = unit.up.kind() == kind && unit.up.span() != null;
    boolean labelled = told != null && (source == Source.LABEL || !formula);
    if (labelled && !(formula && unit.guess.remote())) {
      return told;
    } else if (formula) {
      return unit.up.span();
    }
    Demand demand = unit.demands.isEmpty() ? null : unit.demands.get(0);
    return demand != null && demand.kind() == kind ? demand.span() : told;
  }
}
