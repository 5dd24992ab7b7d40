package weighhouse.formula;

/** What two expressions with a colon between them make together, if one of the plain forms. */
final class RangeJoining {
  private final ReferenceReader references;

  RangeJoining(ReferenceReader references) {
    this.references = references;
  }

  /**
   * {@code A1:B2}, {@code A:B}, {@code 1:2}, {@code Sheet1:Sheet3!A1}; null where the range has to
   * be computed, as in {@code A1:INDEX(...)}.
   */
  Expr join(Expr left, Expr right) {
    if (left instanceof Expr.NameRef first && first.sheet() == null && isOnOneSheet(right)) {
      return acrossSheets(first.name(), right);
    }
    SheetRef sheet = sheetOf(left);
    SheetRef other = sheetOf(right);
    if (other != null && !other.equals(sheet)) {
      return null;
    }
    if (left instanceof Expr.CellRef a && right instanceof Expr.CellRef b) {
      return new Expr.AreaRef(sheet, a.row(), a.column(), b.row(), b.column());
    }
    Axis firstColumn = references.column(end(left));
    Axis lastColumn = references.column(end(right));
    if (firstColumn != null && lastColumn != null) {
      return new Expr.ColumnsRef(sheet, firstColumn, lastColumn);
    }
    Axis firstRow = references.row(end(left));
    Axis lastRow = references.row(end(right));
    return firstRow != null && lastRow != null ? new Expr.RowsRef(sheet, firstRow, lastRow) : null;
  }

  /** Whether a name is one end of a range, {@code $A} or {@code $1}, that means nothing alone. */
  static boolean isHalf(Expr node) {
    if (!(node instanceof Expr.NameRef name)) {
      return false;
    }
    char first = name.name().charAt(0);
    return first == '$' || Character.isDigit(first);
  }

  static boolean isLiteral(Expr node) {
    return node instanceof Expr.Num
        || node instanceof Expr.Str
        || node instanceof Expr.Bool
        || node instanceof Expr.ArrayLiteral;
  }

  private static boolean isOnOneSheet(Expr reference) {
    SheetRef sheet = sheetOf(reference);
    return sheet != null && sheet.workbook() == null && sheet.last() == null;
  }

  private static Expr acrossSheets(String first, Expr reference) {
    SheetRef sheets = new SheetRef(null, first, sheetOf(reference).first());
    return reference instanceof Expr.CellRef cell
        ? new Expr.CellRef(sheets, cell.row(), cell.column())
        : new Expr.NameRef(sheets, ((Expr.NameRef) reference).name());
  }

  private static SheetRef sheetOf(Expr reference) {
    if (reference instanceof Expr.CellRef cell) {
      return cell.sheet();
    }
    return reference instanceof Expr.NameRef name ? name.sheet() : null;
  }

  private static String end(Expr node) {
    if (node instanceof Expr.NameRef name) {
      return name.name();
    }
    return node instanceof Expr.Num number ? number.text() : "";
  }
}
