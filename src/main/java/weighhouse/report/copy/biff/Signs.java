package weighhouse.report.copy.biff;

import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;
import weighhouse.workbook.CellAddress;

/**
 * Puts brackets round a sign in front of a power: Excel takes {@code -x^y} for {@code (-x)^y}, the
 * library that writes .xls takes it for {@code -(x^y)}.
 */
final class Signs {
  private Signs() {}

  static String guarded(String formula, CellAddress cell) {
    try {
      Expr tree = FormulaParser.parse(formula, cell.row(), cell.column()).tree();
      return FormulaPrinter.print(guarded(tree), cell.row(), cell.column());
    } catch (FormulaSyntaxException e) {
      return formula;
    }
  }

  private static Expr guarded(Expr node) {
    List<Expr> children = Trees.children(node).stream().map(Signs::guarded).toList();
    Expr rebuilt = Trees.withChildren(node, children);
    boolean power = rebuilt instanceof Expr.Binary binary && binary.op() == BinaryOp.POWER;
    if (power && children.get(0) instanceof Expr.Unary sign && sign.op() == UnaryOp.MINUS) {
      return new Expr.Binary(BinaryOp.POWER, new Expr.Paren(sign), children.get(1));
    }
    return rebuilt;
  }
}
