package weighhouse.formula;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;

/** Trees of every kind of node, also in combinations that nobody would type. */
final class RandomTrees {
  private RandomTrees() {}

  static Arbitrary<Expr> any() {
    return tree(4);
  }

  private static Arbitrary<Expr> tree(int depth) {
    if (depth == 0) {
      return leaf();
    }
    Arbitrary<Expr> inner = Arbitraries.lazy(() -> tree(depth - 1));
    Arbitrary<List<Expr>> arguments = inner.list().ofMinSize(1).ofMaxSize(3);
    return Arbitraries.oneOf(
        leaf(),
        Combinators.combine(Arbitraries.of(UnaryOp.values()), inner).as(Expr.Unary::new),
        binary(inner),
        binary(inner),
        inner.map(Expr.Paren::new),
        inner.map(Expr.SpillRef::new),
        Combinators.combine(Arbitraries.of("SUM", "IF", "NORM.S.DIST", "LET"), arguments)
            .as(Expr.Call::new),
        arguments.map(all -> new Expr.Call(Expr.Call.APPLY, all)));
  }

  private static Arbitrary<Expr> binary(Arbitrary<Expr> inner) {
    return Combinators.combine(Arbitraries.of(BinaryOp.values()), inner, inner)
        .as(Expr.Binary::new);
  }

  private static Arbitrary<Expr> leaf() {
    return Arbitraries.oneOf(
        Arbitraries.of("1", "0.5", ".5", "1E-05", "12").map(RandomTrees::number),
        Arbitraries.of("", "a", "say \"hi\"", "=A1", "it's").map(Expr.Str::new),
        Arbitraries.of(true, false).map(Expr.Bool::new),
        Arbitraries.of("#N/A", "#REF!", "#DIV/0!").map(Expr.ErrorLiteral::new),
        names(),
        references(),
        tables(),
        Arbitraries.just(
            new Expr.ArrayLiteral(
                List.of(
                    List.of(number("1"), number("-2")),
                    List.of(new Expr.Str("a;b"), new Expr.Bool(true))))));
  }

  private static Expr number(String text) {
    return new Expr.Num(Double.parseDouble(text), text);
  }

  private static Arbitrary<SheetRef> sheets() {
    return Arbitraries.of(
            new SheetRef(null, "Inputs", null),
            new SheetRef(null, "It's a sheet", null),
            new SheetRef(null, "A1", null),
            new SheetRef(null, "Jan", "Dec"),
            new SheetRef(null, "Year 1", "Year 2"),
            new SheetRef("1", "Inputs", null),
            new SheetRef("C:\\dir\\my model.xlsx", "S", null))
        .injectNull(0.5);
  }

  private static Arbitrary<Expr> names() {
    return Combinators.combine(
            sheets(), Arbitraries.of("hr", "\\x", "a", "λ", "Sheet", "p.year", "LOG", "ABCD1"))
        .as(Expr.NameRef::new);
  }

  private static Arbitrary<Axis> axis(int size) {
    return Combinators.combine(
            Arbitraries.integers().between(0, size - 1), Arbitraries.of(true, false))
        .as(Axis::new);
  }

  private static Arbitrary<Expr> references() {
    Arbitrary<Axis> rows = axis(ReferenceReader.ROWS);
    Arbitrary<Axis> columns = axis(ReferenceReader.COLUMNS);
    return Arbitraries.oneOf(
        Combinators.combine(sheets(), rows, columns).as(Expr.CellRef::new),
        Combinators.combine(sheets(), rows, columns, rows, columns).as(Expr.AreaRef::new),
        Combinators.combine(sheets(), columns, columns).as(Expr.ColumnsRef::new),
        Combinators.combine(sheets(), rows, rows).as(Expr.RowsRef::new));
  }

  private static Arbitrary<Expr> tables() {
    Arbitrary<List<String>> specifiers =
        Arbitraries.of(List.of(), List.of("#This Row"), List.of("#Headers", "#Data"));
    Arbitrary<String> column = Arbitraries.of("HR", "p (12 months)", "a[1]'#@", "x:y,z");
    return Combinators.combine(
            Arbitraries.of("Table1", "", "λ.t"),
            specifiers,
            column.injectNull(0.2),
            column.injectNull(0.5))
        .as(
            (table, s, first, last) ->
                new Expr.TableRef(table, s, first, first == null ? null : last));
  }

  /** Without parentheses, relative references wrapped into the sheet. */
  static Expr canonical(Expr node, int row, int column) {
    if (node instanceof Expr.Paren paren) {
      return canonical(paren.inner(), row, column);
    } else if (node instanceof Expr.Unary unary) {
      return new Expr.Unary(unary.op(), canonical(unary.operand(), row, column));
    } else if (node instanceof Expr.Binary binary) {
      return new Expr.Binary(
          binary.op(),
          canonical(binary.left(), row, column),
          canonical(binary.right(), row, column));
    } else if (node instanceof Expr.SpillRef spill) {
      return new Expr.SpillRef(canonical(spill.anchor(), row, column));
    } else if (node instanceof Expr.Call call) {
      List<Expr> arguments = new ArrayList<>();
      call.arguments().forEach(each -> arguments.add(canonical(each, row, column)));
      return new Expr.Call(call.function(), arguments);
    }
    return wrapped(node, row, column);
  }

  private static Expr wrapped(Expr node, int r, int c) {
    if (node instanceof Expr.CellRef ref) {
      return new Expr.CellRef(ref.sheet(), row(ref.row(), r), column(ref.column(), c));
    } else if (node instanceof Expr.AreaRef ref) {
      return new Expr.AreaRef(
          ref.sheet(),
          row(ref.row1(), r),
          column(ref.column1(), c),
          row(ref.row2(), r),
          column(ref.column2(), c));
    } else if (node instanceof Expr.ColumnsRef ref) {
      return new Expr.ColumnsRef(ref.sheet(), column(ref.first(), c), column(ref.last(), c));
    } else if (node instanceof Expr.RowsRef ref) {
      return new Expr.RowsRef(ref.sheet(), row(ref.first(), r), row(ref.last(), r));
    }
    return node;
  }

  private static Axis row(Axis axis, int host) {
    return wrapped(axis, host, ReferenceReader.ROWS);
  }

  private static Axis column(Axis axis, int host) {
    return wrapped(axis, host, ReferenceReader.COLUMNS);
  }

  private static Axis wrapped(Axis axis, int host, int size) {
    return axis.absolute()
        ? axis
        : new Axis(Math.floorMod(axis.value() + host, size) - host, false);
  }
}
