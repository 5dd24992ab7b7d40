package weighhouse.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.antlr.v4.runtime.tree.TerminalNode;
import weighhouse.formula.ExcelFormulaParser.ArrayContext;
import weighhouse.formula.ExcelFormulaParser.BooleanContext;
import weighhouse.formula.ExcelFormulaParser.CallContext;
import weighhouse.formula.ExcelFormulaParser.CellContext;
import weighhouse.formula.ExcelFormulaParser.ElementContext;
import weighhouse.formula.ExcelFormulaParser.ErrorContext;
import weighhouse.formula.ExcelFormulaParser.GroupContext;
import weighhouse.formula.ExcelFormulaParser.HalfContext;
import weighhouse.formula.ExcelFormulaParser.NameContext;
import weighhouse.formula.ExcelFormulaParser.NumberContext;
import weighhouse.formula.ExcelFormulaParser.PrimaryContext;
import weighhouse.formula.ExcelFormulaParser.RowContext;
import weighhouse.formula.ExcelFormulaParser.StringContext;
import weighhouse.formula.ExcelFormulaParser.TableContext;

/** The innermost parts of a formula: literals, references, names, calls, parentheses. */
final class PrimaryBuilder {
  private final TreeBuilder trees;
  private final ReferenceReader references;

  PrimaryBuilder(TreeBuilder trees, ReferenceReader references) {
    this.trees = trees;
    this.references = references;
  }

  Expr build(PrimaryContext context) throws FormulaSyntaxException {
    return trees.place(unplaced(context), context);
  }

  /** The node itself, unless it is half of a range that lacks its other end. */
  Expr whole(Expr node) throws FormulaSyntaxException {
    if (RangeJoining.isHalf(node)) {
      throw new FormulaSyntaxException(
          "a row or column without the other end of its range", trees.spans().get(node).start());
    }
    return node;
  }

  private Expr unplaced(PrimaryContext context) throws FormulaSyntaxException {
    if (context instanceof CellContext cell) {
      return references.cell(sheet(cell.SHEET()), cell.CELL().getSymbol());
    } else if (context instanceof NumberContext number) {
      return number(number.getText());
    } else if (context instanceof NameContext name) {
      return new Expr.NameRef(
          sheet(name.SHEET()), FunctionNames.withoutPrefix(name.NAME().getText()));
    } else if (context instanceof CallContext call) {
      return call(call);
    } else if (context instanceof GroupContext group) {
      return new Expr.Paren(trees.union(group.union()));
    } else if (context instanceof StringContext string) {
      return string(string.getText());
    } else if (context instanceof BooleanContext bool) {
      return new Expr.Bool(bool.getText().equalsIgnoreCase("true"));
    } else if (context instanceof ErrorContext error) {
      return error(error.ERROR().getText());
    } else if (context instanceof HalfContext half) {
      return half(half);
    } else if (context instanceof TableContext table) {
      String qualifier = table.SHEET() == null ? "" : table.SHEET().getText();
      return StructuredReference.parse(
          qualifier, table.TABLE().getText(), table.TABLE().getSymbol().getStartIndex());
    }
    return array((ArrayContext) context);
  }

  private static SheetRef sheet(TerminalNode token) {
    return token == null ? null : SheetPrefix.parse(token.getText());
  }

  private static Expr number(String text) {
    return new Expr.Num(Double.parseDouble(text), text);
  }

  private static Expr string(String quoted) {
    return new Expr.Str(quoted.substring(1, quoted.length() - 1).replace("\"\"", "\""));
  }

  private static Expr error(String text) {
    return new Expr.ErrorLiteral(text.toUpperCase(Locale.ROOT));
  }

  private Expr call(CallContext call) throws FormulaSyntaxException {
    String name = call.FUNCTION().getText();
    name = name.substring(0, name.length() - 1);
    List<Expr> arguments = trees.arguments(call.arguments());
    return call.SHEET() == null
        ? FunctionNames.call(name, arguments)
        : new Expr.Call((call.SHEET().getText() + name).toUpperCase(Locale.ROOT), arguments);
  }

  /** Kept as a name until {@link RangeJoining} sees the other end. */
  private static Expr half(HalfContext half) {
    return new Expr.NameRef(sheet(half.SHEET()), half.getStop().getText());
  }

  private Expr array(ArrayContext context) {
    List<List<Expr>> rows = new ArrayList<>();
    for (RowContext row : context.row()) {
      List<Expr> elements = new ArrayList<>();
      for (ElementContext element : row.element()) {
        int start = element.getStart().getStartIndex();
        String text = element.getText();
        elements.add(trees.place(element(element, text), start, start + text.length()));
      }
      rows.add(elements);
    }
    return new Expr.ArrayLiteral(rows);
  }

  private static Expr element(ElementContext element, String text) {
    if (element.NUMBER() != null) {
      return number(text);
    } else if (element.STRING() != null) {
      return string(text);
    } else if (element.BOOLEAN() != null) {
      return new Expr.Bool(text.equalsIgnoreCase("true"));
    }
    return element.ERROR() != null ? error(text) : new Expr.Missing();
  }
}
