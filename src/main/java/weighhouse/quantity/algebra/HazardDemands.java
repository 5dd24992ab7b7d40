package weighhouse.quantity.algebra;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.quantity.Kind;
import weighhouse.workbook.CellAddress;

/** What stands in the exponent of a survival function. */
final class HazardDemands {
  private final Algebra algebra;
  private final CellAddress host;
  private final List<Demand> found;

  HazardDemands(Algebra algebra, CellAddress host, List<Demand> found) {
    this.algebra = algebra;
    this.host = host;
    this.found = found;
  }

  void of(Expr exponent, String usage) {
    List<Expr> terms = Parts.terms(exponent);
    for (Expr term : terms) {
      Term value = algebra.term(term, host, 0);
      if (terms.size() > 1 && !value.is(Kind.RATE) && isReference(term)) {
        want(term, Kind.CUMULATIVE_HAZARD, usage);
      } else {
        product(term, usage);
      }
    }
  }

  private void product(Expr term, String usage) {
    List<Expr> open = new ArrayList<>();
    boolean curve = false;
    for (Expr factor : Parts.factors(term)) {
      Term value = algebra.term(factor, host, 0);
      List<Expr> power = Parts.power(factor);
      if (power != null) {
        curve |= curve(power);
      } else if (!modifies(value)) {
        open.add(factor);
      }
    }
    Kind kind = curve ? Kind.CURVE_RATE : Kind.RATE;
    if (open.size() == 1) {
      wantEach(open.get(0), kind, usage);
    }
  }

  private static boolean modifies(Term term) {
    return term.literal()
        || term.in(Kinds.TIMES)
        || term.in(Kinds.RATIOS)
        || term.in(Kinds.REDUCTIONS)
        || term.in(Kinds.LOGS)
        || term.is(Kind.CYCLES_PER_YEAR)
        || term.is(Kind.CUMULATIVE_HAZARD);
  }

  /** A power of time, {@code t^a} or {@code (t/b)^a}. */
  private boolean curve(List<Expr> power) {
    Expr base = Trees.inside(power.get(0));
    boolean scaled = base instanceof Expr.Binary quotient && quotient.op() == BinaryOp.DIVIDE;
    Expr time = scaled ? ((Expr.Binary) base).left() : base;
    if (!algebra.term(time, host, 0).in(Kinds.TIMES)) {
      return false;
    }
    want(power.get(1), Kind.CURVE_SHAPE, "EXP(-(t/b)^x)");
    if (scaled) {
      want(((Expr.Binary) base).right(), Kind.CURVE_SCALE, "EXP(-(t/x)^a)");
    }
    return true;
  }

  /** The reference, or each of a sum of them: competing rates. */
  private void wantEach(Expr factor, Kind kind, String usage) {
    Parts.terms(factor).forEach(term -> want(term, kind, usage));
  }

  private boolean isReference(Expr node) {
    return algebra.operands().cells(node, host).isPresent();
  }

  private void want(Expr node, Kind kind, String usage) {
    algebra
        .operands()
        .cells(Trees.inside(node), host)
        .ifPresent(cells -> found.add(new Demand(cells, kind, null, true, usage, host)));
  }
}
