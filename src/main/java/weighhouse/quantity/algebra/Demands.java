package weighhouse.quantity.algebra;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.workbook.CellAddress;

/** What a formula needs its operands to be. */
public final class Demands {
  private static final String DECAY = "1-EXP(-x*t)";

  private final Algebra algebra;
  private final CellAddress host;
  private final List<Demand> found = new ArrayList<>();

  private Demands(Algebra algebra, CellAddress host) {
    this.algebra = algebra;
    this.host = host;
  }

  /**
   * The demands of a formula.
   *
   * @param result what the formula's cell means, as far as known
   * @param trace whether the cell holds the share of a cohort in a state, from the cycle before
   */
  public static List<Demand> of(
      Algebra algebra, Expr tree, CellAddress host, Quantity result, boolean trace) {
    Demands demands = new Demands(algebra, host);
    for (Expr node : Trees.walk(tree)) {
      demands.structural(node);
    }
    if (trace) {
      demands.flows(tree);
    }
    demands.sideways(tree, result.kind());
    return demands.found;
  }

  private void structural(Expr node) {
    List<Expr> taken = Parts.takenFromOne(node);
    if (taken != null && taken.size() == 1) {
      Expr exponent = Parts.argument(taken.get(0), "EXP");
      if (exponent != null) {
        new HazardDemands(algebra, host, found).of(exponent, DECAY);
      }
    }
    List<Expr> power = Parts.power(node);
    if (power != null) {
      power(power.get(0));
    }
    Expr logarithm = Parts.argument(node, "LN");
    List<Expr> survived = logarithm == null ? null : Parts.takenFromOne(logarithm);
    if (survived != null) {
      survived.forEach(x -> probability(x, true, "LN(1-x)"));
    }
    if (node instanceof Expr.Binary quotient && quotient.op() == BinaryOp.DIVIDE) {
      quotient(quotient);
    }
    if (node instanceof Expr.Call call) {
      call(call);
    }
  }

  private void power(Expr base) {
    List<Expr> survived = Parts.takenFromOne(base);
    if (survived != null) {
      survived.forEach(x -> probability(x, true, "(1-x)^n"));
    }
  }

  private void quotient(Expr.Binary quotient) {
    List<Expr> rest = Parts.takenFromOne(quotient.right());
    Expr odds = Trees.inside(quotient.left());
    if (rest != null && rest.size() == 1 && Trees.inside(rest.get(0)).equals(odds)) {
      probability(odds, true, "x/(1-x)");
    }
    List<Expr> growth = Parts.power(quotient.right());
    if (growth != null
        && Trees.inside(growth.get(0)) instanceof Expr.Binary sum
        && sum.op() == BinaryOp.ADD
        && Trees.inside(sum.left()) instanceof Expr.Num one
        && one.value() == 1) {
      want(sum.right(), Kind.DISCOUNT_RATE, true, "1/(1+x)^t");
    }
  }

  private void call(Expr.Call call) {
    List<Expr> arguments = call.arguments();
    switch (call.function()) {
      case "WEIBULL.DIST", "WEIBULL" -> {
        if (arguments.size() > 2) {
          want(arguments.get(1), Kind.CURVE_SHAPE, true, "WEIBULL.DIST(t,x,b)");
          want(arguments.get(2), Kind.CURVE_SCALE, true, "WEIBULL.DIST(t,a,x)");
        }
      }
      case "MMULT" -> matrixProduct(arguments);
      default -> {}
    }
  }

  private void matrixProduct(List<Expr> arguments) {
    if (arguments.size() == 2) {
      for (int i = 0; i < 2; i++) {
        if (algebra.term(arguments.get(i), host, 0).is(Kind.OCCUPANCY)) {
          want(inTranspose(arguments.get(1 - i)), Kind.PROBABILITY, true, "MMULT(state, x)");
        }
      }
    }
  }

  private static Expr inTranspose(Expr node) {
    Expr inner = Parts.argument(node, "TRANSPOSE");
    return inner == null ? node : inner;
  }

  /** In a trace, what multiplies the share in a state is the probability of leaving or staying. */
  private void flows(Expr tree) {
    for (Expr term : Parts.terms(tree)) {
      List<Expr> factors = Parts.factors(term);
      if (factors.stream().noneMatch(f -> algebra.term(f, host, 0).is(Kind.OCCUPANCY))) {
        continue;
      }
      for (Expr factor : factors) {
        List<Expr> leaving = Parts.takenFromOne(factor);
        if (leaving == null) {
          flow(factor);
        } else {
          leaving.forEach(this::flow);
        }
      }
    }
  }

  private void flow(Expr factor) {
    Term term = algebra.term(factor, host, 0);
    boolean other =
        term.literal()
            || term.is(Kind.OCCUPANCY)
            || term.is(Kind.PROPORTION)
            || term.is(Kind.SURVIVAL)
            || term.in(Kinds.RATIOS)
            || term.in(Kinds.REDUCTIONS);
    if (!other) {
      probability(factor, true, "share in state * x");
    }
  }

  /** The operand, or the one operand beside ratios and numbers, is a probability. */
  private void probability(Expr node, boolean firm, String usage) {
    Expr open = null;
    for (Expr factor : Parts.factors(node)) {
      Term term = algebra.term(factor, host, 0);
      boolean modifies =
          term.literal()
              || term.in(Kinds.RATIOS)
              || term.in(Kinds.REDUCTIONS)
              || term.in(Kinds.LOGS);
      if (!modifies) {
        if (open != null) {
          return;
        }
        open = factor;
      }
    }
    if (open != null) {
      want(open, Kind.PROBABILITY, firm, usage);
    }
  }

  /** What the cell is known to be tells what it is copied, selected or computed from. */
  private void sideways(Expr tree, Kind result) {
    if (result == Kind.UNKNOWN) {
      return;
    }
    Expr exponent = Parts.argument(tree, "EXP");
    if (exponent != null && Kinds.RATIOS.contains(result)) {
      want(exponent, Kinds.logOf(result), false, "EXP(x)");
    }
    for (Expr selected : selected(tree)) {
      want(selected, result, false, "=x");
    }
    if (result == Kind.PROBABILITY) {
      List<Expr> rest = Parts.takenFromOne(tree);
      (rest == null ? List.of(tree) : rest).forEach(x -> probability(x, false, "1-x-y"));
    }
  }

  /** What a formula passes on as it is. */
  private static List<Expr> selected(Expr tree) {
    Expr inner = Trees.inside(tree);
    if (!(inner instanceof Expr.Call call)) {
      return List.of(inner);
    }
    List<Expr> arguments = call.arguments();
    return switch (call.function()) {
      case "IF", "CHOOSE" -> arguments.subList(Math.min(1, arguments.size()), arguments.size());
      case "IFERROR", "ROUND", "N", "VALUE" -> arguments.subList(0, Math.min(1, arguments.size()));
      case "MIN", "MAX" -> arguments;
      case "VLOOKUP", "HLOOKUP", "XLOOKUP", "INDEX" -> List.of(call);
      default -> List.of();
    };
  }

  private void want(Expr node, Kind kind, boolean firm, String usage) {
    algebra
        .operands()
        .cells(Trees.inside(node), host)
        .ifPresent(cells -> found.add(new Demand(cells, kind, null, firm, usage, host)));
  }
}
