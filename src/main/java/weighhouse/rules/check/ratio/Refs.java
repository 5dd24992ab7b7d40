package weighhouse.rules.check.ratio;

import weighhouse.formula.Axis;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.SheetRef;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** Writes the expressions that suggestions are made of. */
public final class Refs {
  private Refs() {}

  /** A reference to a cell as the host writes it, with relative coordinates. */
  public static Expr to(CellAddress cell, CellAddress host, Workbook workbook) {
    return to(cell, host, workbook, null);
  }

  /**
   * A reference to a cell as the host writes it.
   *
   * @param like a reference whose dollar signs are to be kept where it is one to a cell; may be
   *     null
   */
  public static Expr to(CellAddress cell, CellAddress host, Workbook workbook, Expr like) {
    SheetRef sheet =
        cell.sheet() == host.sheet()
            ? null
            : new SheetRef(null, workbook.sheet(cell.sheet()).name(), null);
    boolean known = like != null && Trees.inside(like) instanceof Expr.CellRef;
    boolean fixedRow = known && ((Expr.CellRef) Trees.inside(like)).row().absolute();
    boolean fixedColumn = known && ((Expr.CellRef) Trees.inside(like)).column().absolute();
    return new Expr.CellRef(
        sheet,
        axis(cell.row(), host.row(), fixedRow),
        axis(cell.column(), host.column(), fixedColumn));
  }

  private static Axis axis(int index, int host, boolean absolute) {
    return absolute ? new Axis(index, true) : new Axis(index - host, false);
  }

  public static Expr number(String digits) {
    return new Expr.Num(Double.parseDouble(digits), digits);
  }

  public static Expr call(String function, Expr... arguments) {
    return new Expr.Call(function, java.util.List.of(arguments));
  }

  public static Expr ln(Expr of) {
    return call("LN", Trees.inside(of));
  }

  public static Expr minus(Expr left, Expr right) {
    return new Expr.Binary(BinaryOp.SUBTRACT, left, right);
  }

  public static Expr plus(Expr left, Expr right) {
    return new Expr.Binary(BinaryOp.ADD, left, right);
  }

  public static Expr times(Expr left, Expr right) {
    return new Expr.Binary(BinaryOp.MULTIPLY, left, right);
  }

  public static Expr over(Expr left, Expr right) {
    return new Expr.Binary(BinaryOp.DIVIDE, left, right);
  }

  public static Expr square(Expr of) {
    return new Expr.Binary(BinaryOp.POWER, of, number("2"));
  }
}
