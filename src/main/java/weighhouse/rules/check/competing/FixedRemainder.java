package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.Axis;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.recalculate.Values;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.Chains;
import weighhouse.rules.pattern.Factor;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** An effect that changes an exit but not the chance of staying. */
public final class FixedRemainder implements Check {
  private static final double EXACT = 1e-7;

  @Override
  public String name() {
    return "fixed-remainder";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Values neutral = Neutral.values(survey);
    List<Match> matches = new ArrayList<>();
    for (CellRange square : Matrices.of(survey)) {
      for (int i = 0; i < square.rows(); i++) {
        CellRange row = Matrices.row(square, square.firstRow() + i);
        boolean broken = Math.abs(Matrices.sum(row, survey.base()) - 1) > EXACT;
        if (broken && Math.abs(Matrices.sum(row, neutral) - 1) <= EXACT) {
          CellAddress stay = row.first().offset(0, i);
          matches.add(Survey.match(rule, CellRange.of(stay), null, rest(row.columns(), i)));
        }
      }
    }
    for (Traces.Trace trace : Traces.of(survey)) {
      boolean broken = trace.leak(survey.base()) > EXACT;
      if (broken && trace.leak(neutral) <= EXACT) {
        matches.add(match(trace, survey, rule));
      }
    }
    return matches;
  }

  /** One minus the other entries of the row, for its entry at the index. */
  private static Expr rest(int states, int index) {
    Expr rest = new Expr.Num(1, "1");
    if (index > 0) {
      rest = new Expr.Binary(BinaryOp.SUBTRACT, rest, sum(-index, -1));
    }
    if (index < states - 1) {
      rest = new Expr.Binary(BinaryOp.SUBTRACT, rest, sum(1, states - 1 - index));
    }
    return rest;
  }

  private static Expr sum(int from, int to) {
    Axis row = new Axis(0, false);
    Axis first = new Axis(from, false);
    Axis last = new Axis(to, false);
    return from == to
        ? new Expr.CellRef(null, row, first)
        : new Expr.Call("SUM", List.of(new Expr.AreaRef(null, row, first, row, last)));
  }

  /** The chance of staying where it is calculated, or else the state that those who stay are in. */
  private static Match match(Traces.Trace trace, Survey survey, Rule rule) {
    Traces.State state =
        trace.states().stream().filter(s -> !s.absorbing()).findFirst().orElseThrow();
    CellAddress host = state.cells().first();
    Optional<CellAddress> stay = stay(survey.tree(state.region()), state.down(), host, survey);
    CellRange cells = stay.map(cell -> regionOrCell(cell, survey)).orElse(state.region().range());
    return Survey.match(rule, cells, null, null);
  }

  private static CellRange regionOrCell(CellAddress cell, Survey survey) {
    Region region = survey.subject().shapes().regionAt(cell);
    return region == null ? CellRange.of(cell) : region.range();
  }

  /** The cell by which a state multiplies those who were there before. */
  private static Optional<CellAddress> stay(
      Expr tree, boolean down, CellAddress host, Survey survey) {
    for (Expr node : Trees.walk(tree)) {
      List<Factor> factors = Chains.isProduct(node) ? Chains.factors(node) : List.of();
      boolean own = factors.stream().anyMatch(f -> Traces.isBefore(f.node(), down));
      for (Factor factor : own ? factors : List.<Factor>of()) {
        Optional<CellAddress> cell = survey.cell(factor.node(), host);
        if (cell.isPresent() && !Traces.isBefore(factor.node(), down)) {
          return cell;
        }
      }
    }
    return Optional.empty();
  }
}
