package weighhouse.audit.pipeline;

import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.Trees;

/** The form of a formula without its addresses: what stays when rows are inserted around it. */
final class FormulaForm {
  private static final Expr PLACE = new Expr.CellRef(null, new Axis(0, true), new Axis(0, true));

  private FormulaForm() {}

  static String of(Expr tree) {
    Expr blanked =
        Trees.map(
            tree,
            node ->
                node instanceof Expr.CellRef
                        || node instanceof Expr.AreaRef
                        || node instanceof Expr.ColumnsRef
                        || node instanceof Expr.RowsRef
                    ? PLACE
                    : node);
    return FormulaPrinter.print(blanked, 0, 0);
  }
}
