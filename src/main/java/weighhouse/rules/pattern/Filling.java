package weighhouse.rules.pattern;

import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;

/** Writes a rule's correction with the operands in place of its metavariables. */
final class Filling {
  private Filling() {}

  static Expr fill(Expr correction, Reading reading) {
    Expr filled = Trees.replaceAll(correction, node -> operand(node, reading));
    return Trees.map(filled, Filling::simpler);
  }

  private static Expr operand(Expr node, Reading reading) {
    if (!(node instanceof Expr.NameRef name)) {
      return null;
    }
    String metavariable = CyclesOf.metavariable(name.name());
    if (!reading.binds(metavariable)) {
      return null;
    }
    Bound bound = reading.bound(metavariable);
    return CyclesOf.isOne(name.name())
        ? CyclesOf.expression(bound, reading.view())
        : bound.operand();
  }

  /** {@code 1-(1-x)} is x, {@code (x)} needs no parentheses where x is one reference or call. */
  private static Expr simpler(Expr node) {
    if (node instanceof Expr.Paren paren && isOneWord(paren.inner())) {
      return paren.inner();
    }
    Expr inner = complement(node);
    Expr innermost = inner == null ? null : complement(Trees.inside(inner));
    return innermost == null ? node : innermost;
  }

  private static boolean isOneWord(Expr node) {
    return node instanceof Expr.Call || Trees.children(node).isEmpty();
  }

  /** What is subtracted from 1; null of anything else. */
  private static Expr complement(Expr node) {
    boolean complement =
        node instanceof Expr.Binary binary
            && binary.op() == BinaryOp.SUBTRACT
            && binary.left() instanceof Expr.Num number
            && number.value() == 1;
    return complement ? ((Expr.Binary) node).right() : null;
  }
}
