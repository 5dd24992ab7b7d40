package weighhouse.formula;

/** How tightly an expression's text holds together; continues {@link BinaryOp#binding()}. */
final class Binding {
  static final int PERCENT = 6;
  static final int PREFIX = 7;
  static final int PRIMARY = 12;
  static final int SUFFIX = 11;

  private Binding() {}

  static int of(Expr node) {
    if (node instanceof Expr.Binary binary) {
      return binary.op() == BinaryOp.UNION ? 0 : binary.op().binding();
    } else if (node instanceof Expr.Unary unary) {
      return unary.op() == UnaryOp.PERCENT ? PERCENT : PREFIX;
    } else if (node instanceof Expr.Num number) {
      return number.text().startsWith("-") || number.text().startsWith("+") ? PREFIX : PRIMARY;
    } else if (node instanceof Expr.AreaRef
        || node instanceof Expr.ColumnsRef
        || node instanceof Expr.RowsRef
        || spansSheets(node)) {
      return BinaryOp.RANGE.binding();
    } else if (node instanceof Expr.SpillRef
        || (node instanceof Expr.Call call && call.function().equals(Expr.Call.APPLY))) {
      return SUFFIX;
    }
    return PRIMARY;
  }

  /** {@code Jan:Dec!A1} reads from the left like any other range; quoted or in a book it is one. */
  private static boolean spansSheets(Expr node) {
    SheetRef sheet =
        node instanceof Expr.CellRef cell
            ? cell.sheet()
            : node instanceof Expr.NameRef name ? name.sheet() : null;
    return sheet != null
        && sheet.last() != null
        && Character.isLetter(SheetPrefix.print(sheet).charAt(0));
  }

  /** The node, in parentheses if it holds together less than needed. */
  static Expr grouped(Expr node, int needed) {
    return of(node) < needed ? new Expr.Paren(node) : node;
  }
}
