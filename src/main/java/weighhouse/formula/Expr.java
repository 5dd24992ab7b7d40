package weighhouse.formula;

import java.util.List;

/**
 * A formula as a tree. References are relative to the cell that hosts the formula, so that a
 * formula filled over a range is one and the same tree. Equal trees are equal formulas.
 */
public sealed interface Expr {

  /** A number literal; {@code text} keeps the digits as written. */
  record Num(double value, String text) implements Expr {}

  /** A text literal without its quotes. */
  record Str(String value) implements Expr {}

  record Bool(boolean value) implements Expr {}

  /** An error literal such as {@code #N/A} or {@code #REF!}. */
  record ErrorLiteral(String code) implements Expr {}

  /** An argument left empty, as in {@code IF(a,,b)}. */
  record Missing() implements Expr {}

  /** {@code A1}, {@code Sheet!$A1}; sheet is null for the host's own. */
  record CellRef(SheetRef sheet, Axis row, Axis column) implements Expr {}

  /** {@code A1:B2}; the two ends may have been written in any order. */
  record AreaRef(SheetRef sheet, Axis row1, Axis column1, Axis row2, Axis column2)
      implements Expr {}

  /** Whole columns, {@code A:C}. */
  record ColumnsRef(SheetRef sheet, Axis first, Axis last) implements Expr {}

  /** Whole rows, {@code 2:5}. */
  record RowsRef(SheetRef sheet, Axis first, Axis last) implements Expr {}

  /** A defined name or LET variable; sheet is null unless qualified. */
  record NameRef(SheetRef sheet, String name) implements Expr {}

  /**
   * A structured reference.
   *
   * @param table the table's name, empty inside the table itself
   * @param specifiers {@code #Headers}, {@code #This Row} (also written @) and so on
   * @param firstColumn first column or null for all
   * @param lastColumn last column or null for one
   */
  record TableRef(String table, List<String> specifiers, String firstColumn, String lastColumn)
      implements Expr {
    public TableRef {
      specifiers = List.copyOf(specifiers);
    }
  }

  /** {@code A1#}: all that the formula in A1 spills. */
  record SpillRef(Expr anchor) implements Expr {}

  /** {@code {1,2;3,4}}; every element is a literal. */
  record ArrayLiteral(List<List<Expr>> rows) implements Expr {
    public ArrayLiteral {
      rows = rows.stream().map(List::copyOf).toList();
    }
  }

  record Unary(UnaryOp op, Expr operand) implements Expr {}

  record Binary(BinaryOp op, Expr left, Expr right) implements Expr {}

  /** Parentheses as written; they mean nothing beyond the grouping that the tree already has. */
  record Paren(Expr inner) implements Expr {}

  /** A function call; the name in upper case without vendor prefixes such as {@code _xlfn.}. */
  record Call(String function, List<Expr> arguments) implements Expr {
    /** The name of a call whose first argument is what is called, as in LAMBDA(x,x+1)(5). */
    public static final String APPLY = "";

    public Call {
      arguments = List.copyOf(arguments);
    }
  }
}
