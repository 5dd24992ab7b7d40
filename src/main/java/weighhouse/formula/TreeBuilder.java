package weighhouse.formula;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import org.antlr.v4.runtime.ParserRuleContext;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.tree.TerminalNode;
import weighhouse.formula.ExcelFormulaParser.ArgumentContext;
import weighhouse.formula.ExcelFormulaParser.ArgumentsContext;
import weighhouse.formula.ExcelFormulaParser.ExpressionContext;
import weighhouse.formula.ExcelFormulaParser.FormulaContext;
import weighhouse.formula.ExcelFormulaParser.ItemContext;
import weighhouse.formula.ExcelFormulaParser.PrefixContext;
import weighhouse.formula.ExcelFormulaParser.SuffixContext;
import weighhouse.formula.ExcelFormulaParser.TermContext;
import weighhouse.formula.ExcelFormulaParser.UnionContext;

/** Builds the tree of one formula from what the grammar recognised, noting where nodes stand. */
final class TreeBuilder {
  private static final int MAX_SIGNS = 16;

  private final IdentityHashMap<Expr, SourceSpan> spans = new IdentityHashMap<>();
  private final PrimaryBuilder primaries;
  private final RangeJoining joining;

  TreeBuilder(int hostRow, int hostColumn) {
    ReferenceReader references = new ReferenceReader(hostRow, hostColumn);
    primaries = new PrimaryBuilder(this, references);
    joining = new RangeJoining(references);
  }

  IdentityHashMap<Expr, SourceSpan> spans() {
    return spans;
  }

  Expr formula(FormulaContext context) throws FormulaSyntaxException {
    return union(context.union());
  }

  Expr union(UnionContext context) throws FormulaSyntaxException {
    OperatorFolding folding = new OperatorFolding(this);
    for (ExpressionContext each : context.expression()) {
      if (!folding.isEmpty()) {
        folding.operator(BinaryOp.UNION);
      }
      folding.operand(expression(each));
    }
    return folding.result();
  }

  private Expr expression(ExpressionContext context) throws FormulaSyntaxException {
    OperatorFolding folding = new OperatorFolding(this);
    for (var child : context.children) {
      if (child instanceof TermContext term) {
        folding.operand(term(term));
      } else {
        folding.operator(BinaryOp.of(child.getText()));
      }
    }
    return folding.result();
  }

  private Expr term(TermContext context) throws FormulaSyntaxException {
    Expr tree = reference(context);
    int end = spans.get(tree).end();
    List<PrefixContext> prefixes = context.prefix();
    List<TerminalNode> percents = context.PERCENT();
    if (prefixes.size() + percents.size() > MAX_SIGNS) {
      int start = context.getStart().getStartIndex();
      throw new FormulaSyntaxException("more than " + MAX_SIGNS + " signs in a row", start);
    }
    for (int i = prefixes.size() - 1; i >= 0; i--) {
      UnaryOp op = UnaryOp.of(prefixes.get(i).getText());
      int start = prefixes.get(i).getStart().getStartIndex();
      tree = place(new Expr.Unary(op, tree), start, end);
    }
    for (TerminalNode percent : percents) {
      int start = spans.get(tree).start();
      end = percent.getSymbol().getStopIndex() + 1;
      tree = place(new Expr.Unary(UnaryOp.PERCENT, tree), start, end);
    }
    return tree;
  }

  /** The term's items joined by colons first, then by intersections. */
  private Expr reference(TermContext context) throws FormulaSyntaxException {
    OperatorFolding intersections = new OperatorFolding(this);
    Expr range = null;
    for (var child : context.children) {
      if (child instanceof ItemContext item) {
        Expr next = item(item);
        range = range == null ? next : range(range, next);
      } else if (isIntersection(child)) {
        intersections.operand(primaries.whole(range));
        intersections.operator(BinaryOp.INTERSECTION);
        range = null;
      }
    }
    intersections.operand(primaries.whole(range));
    return intersections.result();
  }

  private static boolean isIntersection(Object child) {
    return child instanceof TerminalNode token
        && token.getSymbol().getType() == ExcelFormulaParser.INTERSECT;
  }

  private Expr range(Expr left, Expr right) throws FormulaSyntaxException {
    int start = spans.get(left).start();
    int end = spans.get(right).end();
    Expr area = joining.join(left, right);
    if (area != null) {
      return place(area, start, end);
    }
    if (RangeJoining.isLiteral(left) || RangeJoining.isLiteral(right)) {
      throw new FormulaSyntaxException("a range needs a reference on both sides of ':'", start);
    }
    return place(
        new Expr.Binary(BinaryOp.RANGE, primaries.whole(left), primaries.whole(right)), start, end);
  }

  private Expr item(ItemContext context) throws FormulaSyntaxException {
    Expr tree = primaries.build(context.primary());
    int start = context.getStart().getStartIndex();
    for (SuffixContext suffix : context.suffix()) {
      int end = suffix.getStop().getStopIndex() + 1;
      tree = place(withSuffix(tree, suffix), start, end);
    }
    return tree;
  }

  private Expr withSuffix(Expr tree, SuffixContext suffix) throws FormulaSyntaxException {
    if (suffix.arguments() == null) {
      if (RangeJoining.isLiteral(tree)) {
        throw new FormulaSyntaxException("unexpected '#'", suffix.getStart().getStartIndex());
      }
      return new Expr.SpillRef(tree);
    }
    List<Expr> arguments = arguments(suffix.arguments());
    if (tree instanceof Expr.NameRef name && name.sheet() == null) {
      return FunctionNames.call(name.name(), arguments);
    }
    arguments.add(0, tree);
    return new Expr.Call(Expr.Call.APPLY, arguments);
  }

  List<Expr> arguments(ArgumentsContext context) throws FormulaSyntaxException {
    List<Expr> arguments = new ArrayList<>();
    List<ArgumentContext> written = context.argument();
    if (written.size() == 1 && written.get(0).expression() == null) {
      return arguments;
    }
    for (ArgumentContext argument : written) {
      if (argument.expression() == null) {
        int at = argument.getStart().getStartIndex();
        arguments.add(place(new Expr.Missing(), at, at));
      } else {
        arguments.add(expression(argument.expression()));
      }
    }
    return arguments;
  }

  /** Notes where a new node stands. */
  Expr place(Expr node, int start, int end) {
    spans.put(node, new SourceSpan(start, end));
    return node;
  }

  Expr place(Expr node, ParserRuleContext context) {
    Token last = context.getStop();
    return place(node, context.getStart().getStartIndex(), last.getStopIndex() + 1);
  }

  Expr join(BinaryOp op, Expr left, Expr right) {
    return place(new Expr.Binary(op, left, right), spans.get(left).start(), spans.get(right).end());
  }
}
