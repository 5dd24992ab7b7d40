package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.Moving;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Exits of one state that were each made a probability of a rate as if the others were not there.
 */
public final class SeparateConversion implements Check {
  @Override
  public String name() {
    return "separate-conversion";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Set<CellRange> reported = new HashSet<>();
    List<Match> matches = new ArrayList<>();
    for (Region region : survey.regions()) {
      CellAddress host = region.range().first();
      for (Remainder remainder : Remainder.in(survey.tree(region), host, survey)) {
        List<Conversion> exits = new ArrayList<>();
        remainder.exits().forEach(exit -> Conversion.of(exit, host, survey).ifPresent(exits::add));
        boolean all = exits.size() == remainder.exits().size();
        for (Conversion exit : exits.size() > 1 ? exits : List.<Conversion>of()) {
          Match match = match(exit, exits, all, rule, survey);
          if (reported.add(match.cells().get(0))) {
            matches.add(match);
          }
        }
      }
    }
    return matches;
  }

  /** The exit's share of all who leave: its own rate over all rates, times those who leave. */
  private static Match match(
      Conversion exit, List<Conversion> exits, boolean all, Rule rule, Survey survey) {
    Region region = survey.subject().shapes().regionAt(exit.host());
    Expr share = all ? share(exit, exits, survey) : null;
    Expr suggestion = share == null ? null : Trees.replace(survey.tree(region), exit.node(), share);
    return Survey.match(rule, region.range(), exit.node(), suggestion);
  }

  private static Expr share(Conversion exit, List<Conversion> exits, Survey survey) {
    Expr total = null;
    for (Conversion other : exits) {
      Expr rate =
          Moving.move(other.hazard(), other.host(), exit.host(), survey.subject().workbook());
      total = total == null ? rate : new Expr.Binary(BinaryOp.ADD, total, rate);
    }
    Expr minus = new Expr.Unary(UnaryOp.MINUS, total);
    Expr leaving =
        new Expr.Binary(
            BinaryOp.SUBTRACT, new Expr.Num(1, "1"), new Expr.Call("EXP", List.of(minus)));
    Expr share = new Expr.Binary(BinaryOp.DIVIDE, exit.hazard(), total);
    return new Expr.Binary(BinaryOp.MULTIPLY, share, leaving);
  }

  /**
   * A probability made of a rate alone.
   *
   * @param node {@code 1-EXP(-x)}
   * @param hazard x
   * @param host the cell whose formula it is
   */
  private record Conversion(Expr node, Expr hazard, CellAddress host) {
    private static final int MOST_COPIES = 4;
    private static final Set<String> PASSING = Set.of("ROUND", "IFERROR", "MIN", "MAX");

    /** The conversion that an exit is or refers to. */
    static Optional<Conversion> of(Expr exit, CellAddress host, Survey survey) {
      Expr node = Trees.inside(exit);
      CellAddress at = host;
      for (int step = 0; step < MOST_COPIES; step++) {
        Optional<CellAddress> cell = survey.cell(node, at);
        if (cell.isEmpty() || survey.subject().shapes().at(cell.get()) == null) {
          break;
        }
        at = cell.get();
        node = passed(survey.subject().shapes().at(at).tree());
      }
      Expr hazard = hazard(node);
      return hazard == null ? Optional.empty() : Optional.of(new Conversion(node, hazard, at));
    }

    /** The one operand that a bound or a rounding passes on. */
    private static Expr passed(Expr node) {
      Expr inside = Trees.inside(node);
      if (!(inside instanceof Expr.Call call) || !PASSING.contains(call.function())) {
        return inside;
      }
      List<Expr> varying =
          call.arguments().stream().filter(a -> !(Trees.inside(a) instanceof Expr.Num)).toList();
      return varying.size() == 1 ? passed(varying.get(0)) : inside;
    }

    private static Expr hazard(Expr node) {
      boolean complement =
          node instanceof Expr.Binary binary
              && binary.op() == BinaryOp.SUBTRACT
              && Trees.inside(binary.left()) instanceof Expr.Num one
              && one.value() == 1;
      Expr rest = complement ? Trees.inside(((Expr.Binary) node).right()) : node;
      boolean exponential =
          complement && rest instanceof Expr.Call call && call.function().equals("EXP");
      return exponential ? negated(Trees.children(rest).get(0)) : null;
    }

    /** What a negative expression is the negative of; null where it shows no sign. */
    private static Expr negated(Expr expression) {
      Expr node = Trees.inside(expression);
      if (node instanceof Expr.Unary unary && unary.op() == UnaryOp.MINUS) {
        return Trees.inside(unary.operand());
      } else if (node instanceof Expr.Binary product
          && (product.op() == BinaryOp.MULTIPLY || product.op() == BinaryOp.DIVIDE)) {
        Expr left = negated(product.left());
        return left == null ? null : new Expr.Binary(product.op(), left, product.right());
      }
      return null;
    }
  }
}
