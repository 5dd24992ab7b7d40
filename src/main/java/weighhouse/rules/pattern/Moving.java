package weighhouse.rules.pattern;

import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.SheetRef;
import weighhouse.formula.Trees;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** Rewrites an expression of one cell so that it means the same in another. */
public final class Moving {
  private final Workbook workbook;
  private final CellAddress from;
  private final CellAddress to;

  private Moving(Workbook workbook, CellAddress from, CellAddress to) {
    this.workbook = workbook;
    this.from = from;
    this.to = to;
  }

  /** The expression of the cell {@code from} as it has to be written in the cell {@code to}. */
  public static Expr move(Expr expression, CellAddress from, CellAddress to, Workbook workbook) {
    return from.equals(to)
        ? expression
        : Trees.map(expression, new Moving(workbook, from, to)::moved);
  }

  private Expr moved(Expr node) {
    if (node instanceof Expr.CellRef cell) {
      return new Expr.CellRef(sheet(cell.sheet()), row(cell.row()), column(cell.column()));
    } else if (node instanceof Expr.AreaRef area) {
      return new Expr.AreaRef(
          sheet(area.sheet()),
          row(area.row1()),
          column(area.column1()),
          row(area.row2()),
          column(area.column2()));
    } else if (node instanceof Expr.ColumnsRef columns) {
      return new Expr.ColumnsRef(
          sheet(columns.sheet()), column(columns.first()), column(columns.last()));
    } else if (node instanceof Expr.RowsRef rows) {
      return new Expr.RowsRef(sheet(rows.sheet()), row(rows.first()), row(rows.last()));
    }
    return node;
  }

  private SheetRef sheet(SheetRef sheet) {
    if (sheet != null) {
      boolean own =
          sheet.workbook() == null
              && sheet.last() == null
              && workbook.sheetIndex(sheet.first()) == to.sheet();
      return own ? null : sheet;
    }
    boolean same = from.sheet() == to.sheet();
    return same ? null : new SheetRef(null, workbook.sheet(from.sheet()).name(), null);
  }

  private Axis row(Axis axis) {
    return axis.absolute() ? axis : new Axis(axis.value() + from.row() - to.row(), false);
  }

  private Axis column(Axis axis) {
    return axis.absolute() ? axis : new Axis(axis.value() + from.column() - to.column(), false);
  }
}
