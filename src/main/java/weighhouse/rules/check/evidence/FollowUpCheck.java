package weighhouse.rules.check.evidence;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Pattern;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Cycle;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** A constant hazard ratio used long after the follow-up that the workbook states. */
public final class FollowUpCheck implements Check {
  private static final Pattern FOLLOW_UP =
      Pattern.compile("(?i)(?<!loss to |lost to )\\bfollow[- ]?up\\b(?! (cost|visit|care|scan))");
  private static final Pattern HORIZON = Pattern.compile("(?i)\\b(time|model|analytic) horizon\\b");
  private static final Pattern WANING =
      Pattern.compile(
          "(?i)\\bwan(e|es|ing)\\b|\\bfad(e|es|ing)\\b|effect (duration|stops|ends|lasts|lost)"
              + "|duration of (the )?(treatment )?effect|loss of (treatment )?effect");
  private static final double BEYOND = 1.25;

  @Override
  public String name() {
    return "effect-past-follow-up";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    Durations durations = new Durations(subject.workbook());
    List<Durations.Duration> stated = durations.of(FOLLOW_UP);
    if (stated.isEmpty() || durations.says(WANING)) {
      return List.of();
    }
    double longest = stated.stream().mapToDouble(Durations.Duration::years).max().orElseThrow();
    double horizon = horizon(durations, model);
    boolean used = stated.stream().anyMatch(d -> !dependents(d.cell(), model).isEmpty());
    if (used || !(horizon > BEYOND * longest)) {
      return List.of();
    }
    return EnteredRatios.in(model).stream()
        .filter(ratio -> model.formula(ratio) == null)
        .filter(ratio -> EnteredRatios.isUsed(ratio, model) && !isTimed(ratio, model))
        .map(ratio -> match(rule, ratio, longest, horizon, subject))
        .toList();
  }

  private static List<CellRange> dependents(CellAddress cell, ModelView model) {
    return model.subject().recalculation().dependents(Set.of(cell));
  }

  /** As stated, else as many cycles as the model has rows or columns of occupancy. */
  private static double horizon(Durations durations, ModelView model) {
    OptionalDouble told =
        durations.of(HORIZON).stream().mapToDouble(Durations.Duration::years).max();
    if (told.isPresent()) {
      return told.getAsDouble();
    }
    Cycle cycle = model.subject().quantities().cycle();
    long cycles =
        model.subject().quantities().ranges().stream()
            .filter(range -> model.quantity(range.first()).kind() == Kind.OCCUPANCY)
            .mapToLong(range -> Math.max(range.rows(), range.columns()))
            .max()
            .orElse(0);
    return cycle.known() ? cycles * cycle.years() : Double.NaN;
  }

  /** Whether some formula on the ratio's way asks what time it is. */
  private static boolean isTimed(CellAddress ratio, ModelView model) {
    return dependents(ratio, model).stream()
        .map(range -> model.formula(range.first()))
        .anyMatch(
            formula ->
                formula != null && Trees.contains(formula, node -> asksForTime(node, formula)));
  }

  private static boolean asksForTime(Expr node, Expr formula) {
    boolean compares =
        node instanceof Expr.Binary binary
            && (binary.op() == BinaryOp.LESS
                || binary.op() == BinaryOp.LESS_OR_EQUAL
                || binary.op() == BinaryOp.GREATER
                || binary.op() == BinaryOp.GREATER_OR_EQUAL);
    return compares
        && Trees.contains(formula, n -> n instanceof Expr.Call c && c.function().equals("IF"));
  }

  private static Match match(
      Rule rule, CellAddress ratio, double followUp, double horizon, Subject subject) {
    return Found.at(rule, ratio)
        .with("hr", Refs.to(ratio, ratio, subject.workbook()))
        .saying(
            String.format(
                Locale.ROOT,
                "The workbook states a follow-up of %.3g years; the ratio acts for %.3g years.",
                followUp,
                horizon))
        .match();
  }
}
