package weighhouse.formula;

/** Shows a tree with parentheses around every operation. */
final class Grouping {
  private Grouping() {}

  static String of(Expr node) {
    if (node instanceof Expr.Binary binary) {
      return "(" + of(binary.left()) + binary.op().symbol() + of(binary.right()) + ")";
    } else if (node instanceof Expr.Unary unary) {
      String operand = of(unary.operand());
      String symbol = unary.op().symbol();
      return "(" + (unary.op().prefix() ? symbol + operand : operand + symbol) + ")";
    }
    return FormulaPrinter.print(node, 0, 0);
  }
}
