package weighhouse.formula;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import weighhouse.workbook.A1;

/**
 * From a tree to the text that Excel accepts in the host cell. Parentheses of the tree are kept;
 * others are added only where the tree would otherwise read differently.
 */
public final class FormulaPrinter {
  private static final RangeJoining JOINING = new RangeJoining(new ReferenceReader(0, 0));

  private final int hostRow;
  private final int hostColumn;
  private final StringBuilder out = new StringBuilder();

  private FormulaPrinter(int hostRow, int hostColumn) {
    this.hostRow = hostRow;
    this.hostColumn = hostColumn;
  }

  /**
   * Prints a tree without the equals sign. Relative references that leave the sheet wrap around its
   * edge, as Excel's do.
   *
   * @param hostRow zero-based row of the cell that the text is for
   * @param hostColumn zero-based column of that cell
   */
  public static String print(Expr tree, int hostRow, int hostColumn) {
    FormulaPrinter printer = new FormulaPrinter(hostRow, hostColumn);
    printer.append(tree);
    return printer.out.toString();
  }

  private void append(Expr node) {
    if (node instanceof Expr.Binary binary) {
      chain(binary);
    } else if (node instanceof Expr.Unary unary) {
      unary(unary);
    } else if (node instanceof Expr.Paren paren) {
      enclosed(paren.inner());
    } else if (node instanceof Expr.Call call) {
      call(call);
    } else if (node instanceof Expr.SpillRef spill) {
      boolean literal = RangeJoining.isLiteral(spill.anchor());
      operand(spill.anchor(), literal ? Integer.MAX_VALUE : Binding.PRIMARY);
      out.append('#');
    } else if (node instanceof Expr.ArrayLiteral array) {
      array(array);
    } else {
      leaf(node);
    }
  }

  private void leaf(Expr node) {
    if (node instanceof Expr.Num number) {
      out.append(number.text());
    } else if (node instanceof Expr.Str string) {
      out.append('"').append(string.value().replace("\"", "\"\"")).append('"');
    } else if (node instanceof Expr.Bool bool) {
      out.append(bool.value() ? "TRUE" : "FALSE");
    } else if (node instanceof Expr.ErrorLiteral error) {
      out.append(error.code());
    } else if (node instanceof Expr.NameRef name) {
      out.append(SheetPrefix.print(name.sheet())).append(name.name());
    } else if (node instanceof Expr.TableRef table) {
      out.append(StructuredReference.print(table));
    } else {
      reference(node);
    }
  }

  private void reference(Expr node) {
    if (node instanceof Expr.CellRef cell) {
      out.append(SheetPrefix.print(cell.sheet()));
      cell(cell.row(), cell.column());
    } else if (node instanceof Expr.AreaRef area) {
      out.append(SheetPrefix.print(area.sheet()));
      cell(area.row1(), area.column1());
      out.append(':');
      cell(area.row2(), area.column2());
    } else if (node instanceof Expr.ColumnsRef columns) {
      out.append(SheetPrefix.print(columns.sheet()));
      column(columns.first());
      out.append(':');
      column(columns.last());
    } else if (node instanceof Expr.RowsRef rows) {
      out.append(SheetPrefix.print(rows.sheet()));
      row(rows.first());
      out.append(':');
      row(rows.last());
    }
  }

  private void cell(Axis row, Axis column) {
    column(column);
    row(row);
  }

  private void column(Axis axis) {
    out.append(axis.absolute() ? "$" : "")
        .append(A1.column(Math.floorMod(axis.resolve(hostColumn), ReferenceReader.COLUMNS)));
  }

  private void row(Axis axis) {
    out.append(axis.absolute() ? "$" : "")
        .append(Math.floorMod(axis.resolve(hostRow), ReferenceReader.ROWS) + 1);
  }

  /** Prints the left spine in a loop: a sum of thousands of terms is as many levels deep. */
  private void chain(Expr.Binary outermost) {
    Deque<Expr.Binary> spine = new ArrayDeque<>();
    spine.push(outermost);
    while (spine.peek().left() instanceof Expr.Binary inner && needsNone(inner, spine.peek())) {
      spine.push(inner);
    }
    left(spine.peek());
    while (!spine.isEmpty()) {
      Expr.Binary binary = spine.pop();
      out.append(binary.op().symbol());
      right(binary);
    }
  }

  private static boolean needsNone(Expr.Binary inner, Expr.Binary outer) {
    return !isReference(outer) && Binding.of(inner) >= Binding.of(outer);
  }

  private void left(Expr.Binary binary) {
    Expr left = binary.left();
    boolean literal = isReference(binary) && RangeJoining.isLiteral(left);
    if (literal || readsAsCall(binary)) {
      enclosed(left);
    } else {
      operand(left, Binding.of(binary));
    }
  }

  private void right(Expr.Binary binary) {
    Expr right = binary.right();
    boolean literal = isReference(binary) && RangeJoining.isLiteral(right);
    boolean joins = binary.op() == BinaryOp.RANGE && JOINING.join(binary.left(), right) != null;
    if (literal || joins) {
      enclosed(right);
    } else {
      operand(right, Binding.of(binary) + 1);
    }
  }

  private static boolean isReference(Expr.Binary binary) {
    return binary.op() == BinaryOp.RANGE || binary.op() == BinaryOp.INTERSECTION;
  }

  /** A name, a space and a parenthesis would read as a call. */
  private boolean readsAsCall(Expr.Binary binary) {
    if (binary.op() != BinaryOp.INTERSECTION) {
      return false;
    }
    Expr end = binary.left();
    while (end instanceof Expr.Binary inner && inner.op() == BinaryOp.INTERSECTION) {
      end = inner.right();
    }
    return end instanceof Expr.NameRef && opensWithParenthesis(binary);
  }

  private boolean opensWithParenthesis(Expr.Binary binary) {
    int mark = out.length();
    right(binary);
    boolean opens = out.charAt(mark) == '(';
    out.setLength(mark);
    return opens;
  }

  private void unary(Expr.Unary unary) {
    if (unary.op().prefix()) {
      out.append(unary.op().symbol());
      operand(unary.operand(), Binding.PREFIX);
    } else {
      operand(unary.operand(), Binding.PERCENT);
      out.append(unary.op().symbol());
    }
  }

  private void operand(Expr node, int needed) {
    if (Binding.of(node) < needed) {
      enclosed(node);
    } else {
      append(node);
    }
  }

  private void enclosed(Expr node) {
    out.append('(');
    append(node);
    out.append(')');
  }

  private void call(Expr.Call call) {
    List<Expr> arguments = call.arguments();
    if (call.function().equals(Expr.Call.APPLY)) {
      Expr function = arguments.get(0);
      if (function instanceof Expr.Call || function instanceof Expr.Paren) {
        append(function);
      } else {
        enclosed(function);
      }
      arguments = arguments.subList(1, arguments.size());
    } else {
      out.append(call.function());
    }
    out.append('(');
    separated(arguments, ',');
    out.append(')');
  }

  private void array(Expr.ArrayLiteral array) {
    out.append('{');
    String separator = "";
    for (List<Expr> row : array.rows()) {
      out.append(separator);
      separated(row, ',');
      separator = ";";
    }
    out.append('}');
  }

  private void separated(List<Expr> nodes, char separator) {
    for (int i = 0; i < nodes.size(); i++) {
      if (i > 0) {
        out.append(separator);
      }
      operand(nodes.get(i), 1);
    }
  }
}
