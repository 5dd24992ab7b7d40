package weighhouse.rules;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.recalculate.Values;
import weighhouse.rules.pattern.FormulaView;
import weighhouse.rules.pattern.Found;
import weighhouse.rules.pattern.ModelScope;
import weighhouse.rules.pattern.PatternFinder;
import weighhouse.rules.pattern.TypedPattern;
import weighhouse.workbook.CellAddress;

/** All that the rules' patterns find in the formula of one cell. */
final class HostMatcher {
  private static final Set<Kind> NEVER_NEGATIVE =
      EnumSet.of(
          Kind.PROBABILITY,
          Kind.RATE,
          Kind.CUMULATIVE_HAZARD,
          Kind.SURVIVAL,
          Kind.ODDS,
          Kind.HAZARD_RATIO,
          Kind.RATE_RATIO,
          Kind.RISK_RATIO,
          Kind.ODDS_RATIO,
          Kind.MORTALITY_RATIO);

  private final List<LoadedRule> rules;
  private final Subject subject;
  private final ModelScope scope;
  private final Values base;

  HostMatcher(List<LoadedRule> rules, Subject subject) {
    this.rules = rules.stream().filter(rule -> !rule.file().patterns().isEmpty()).toList();
    this.subject = subject;
    this.scope = new ModelScope(subject.workbook(), subject.shapes(), subject.quantities());
    this.base = subject.recalculation().base();
  }

  /** A pattern of a rule, found. */
  record Hit(LoadedRule rule, Found found) {
    /** Whether another cell of the same formula has the same hit. */
    @SuppressWarnings("ReferenceEquality") // the cells share one tree
    boolean sameAs(Hit other) {
      return rule == other.rule
          && found.pattern() == other.found.pattern()
          && found.offending() == other.found.offending()
          && found.operands().equals(other.found.operands());
    }
  }

  List<Hit> match(Expr tree, CellAddress host) {
    FormulaView view = new FormulaView(tree, host, scope);
    ToDoubleFunction<Expr> values =
        expression -> subject.recalculation().evaluate(expression, host, base).number();
    PatternFinder finder = new PatternFinder(view, values);
    List<Hit> hits = new ArrayList<>();
    for (LoadedRule rule : rules) {
      for (Found found : ofRule(rule, finder)) {
        hits.add(new Hit(rule, found));
      }
    }
    hits.removeIf(hit -> hasNegativeRisk(hit, host, values));
    hits.removeIf(
        hit ->
            ComparedArms.reversed(
                hit.rule().rule(), hit.found(), host, subject.quantities(), scope));
    hits.removeIf(hit -> hits.stream().anyMatch(other -> yields(hit, other)));
    return hits;
  }

  /** Minus a hazard is typed like the hazard that it was made of; no risk is below 0. */
  private boolean hasNegativeRisk(Hit hit, CellAddress host, ToDoubleFunction<Expr> values) {
    return hit.found().operands().values().stream()
        .filter(operand -> NEVER_NEGATIVE.contains(subject.quantities().of(operand, host).kind()))
        .anyMatch(operand -> values.applyAsDouble(operand) < 0);
  }

  /** A rule's patterns are several ways to say one thing: the first that fits a place speaks. */
  private static List<Found> ofRule(LoadedRule rule, PatternFinder finder) {
    List<Found> all = new ArrayList<>();
    for (TypedPattern pattern : rule.file().patterns()) {
      for (Found found : finder.find(pattern)) {
        if (all.stream().noneMatch(other -> nested(other.offending(), found.offending()))) {
          all.add(found);
        }
      }
    }
    return all;
  }

  private static boolean yields(Hit hit, Hit other) {
    return hit.rule().yieldsTo(other.rule())
        && nested(hit.found().offending(), other.found().offending());
  }

  @SuppressWarnings("ReferenceEquality") // one very node
  private static boolean nested(Expr a, Expr b) {
    return Trees.contains(a, node -> node == b) || Trees.contains(b, node -> node == a);
  }
}
