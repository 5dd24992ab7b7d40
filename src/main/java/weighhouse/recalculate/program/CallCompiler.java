package weighhouse.recalculate.program;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.recalculate.functions.Function;
import weighhouse.recalculate.functions.Functions;
import weighhouse.recalculate.functions.Signature;

/** Compiles function calls, LET and LAMBDA among them, with the names that those give. */
final class CallCompiler {
  private static final int MOST_LOCALS = 255;

  private final Compiler compiler;
  private final Deque<Map<String, Integer>> scopes = new ArrayDeque<>();
  private int places;

  CallCompiler(Compiler compiler) {
    this.compiler = compiler;
  }

  /** Place of a name given by LET or LAMBDA, or null. */
  Integer local(String name) {
    for (Map<String, Integer> scope : scopes) {
      Integer place = scope.get(name.toLowerCase(Locale.ROOT));
      if (place != null) {
        return place;
      }
    }
    return null;
  }

  private int define(Map<String, Integer> scope, Expr name) {
    if (!(name instanceof Expr.NameRef ref) || places > MOST_LOCALS) {
      throw new UnsupportedFormulaException("LET");
    }
    scope.put(ref.name().toLowerCase(Locale.ROOT), places);
    return places++;
  }

  Node call(Expr.Call call, boolean array) {
    List<Expr> arguments = call.arguments();
    return switch (call.function()) {
      case "LET" -> let(arguments, array);
      case "LAMBDA" -> lambda(arguments);
      case "IF" -> choice(arguments, array);
      default -> function(call, array);
    };
  }

  private Node choice(List<Expr> arguments, boolean array) {
    if (arguments.size() < 2 || arguments.size() > 3) {
      throw new UnsupportedFormulaException("IF");
    }
    Node otherwise =
        arguments.size() < 3
            ? new Constant(new weighhouse.recalculate.Value.Logical(false))
            : compiler.node(arguments.get(2), array);
    return new Choice(
        compiler.node(arguments.get(0), array), compiler.node(arguments.get(1), array), otherwise);
  }

  private Node function(Expr.Call call, boolean array) {
    Function function = Functions.find(call.function());
    if (function == null || !function.signature().accepts(call.arguments().size())) {
      throw new UnsupportedFormulaException(call.function());
    }
    Node[] arguments = arguments(call.arguments(), function.signature(), array);
    if (function instanceof Function.OfNumber number) {
      return new NumberCall(number.operator(), arguments[0]);
    } else if (function instanceof Function.OfNumbers numbers) {
      return new NumbersCall(numbers.operator(), arguments[0], arguments[1]);
    } else if (function instanceof Function.Folding folding) {
      return new FoldNode(folding.fold(), arguments);
    } else if (function instanceof Function.Selecting selecting) {
      return new SelectCall(selecting.selector(), selecting.signature(), arguments);
    } else if (function instanceof Function.Locating locating) {
      compiler.pointing |= locating.anywhere();
      return new LocateCall(locating, arguments, array);
    } else if (function instanceof Function.Drawing drawing) {
      compiler.drawing = true;
      return new GeneralCall(drawing.body(), drawing.signature(), arguments);
    }
    Function.General general = (Function.General) function;
    return new GeneralCall(general.body(), general.signature(), arguments);
  }

  private Node[] arguments(List<Expr> trees, Signature signature, boolean array) {
    Node[] nodes = new Node[trees.size()];
    for (int i = 0; i < nodes.length; i++) {
      char kind = signature.kind(i);
      nodes[i] =
          kind == 'N'
              ? compiler.unread(trees.get(i), array)
              : compiler.node(trees.get(i), array || kind == 'A');
    }
    return nodes;
  }

  private Node let(List<Expr> arguments, boolean array) {
    if (arguments.size() < 3 || arguments.size() % 2 == 0) {
      throw new UnsupportedFormulaException("LET");
    }
    int count = arguments.size() / 2;
    int[] defined = new int[count];
    Node[] definitions = new Node[count];
    Map<String, Integer> scope = new HashMap<>();
    scopes.push(scope);
    for (int i = 0; i < count; i++) {
      definitions[i] = compiler.node(arguments.get(2 * i + 1), array);
      defined[i] = define(scope, arguments.get(2 * i));
    }
    Node result = compiler.node(arguments.get(arguments.size() - 1), array);
    scopes.pop();
    return new LetNode(defined, definitions, result);
  }

  private Node lambda(List<Expr> arguments) {
    Map<String, Integer> scope = new HashMap<>();
    int[] parameters = new int[arguments.size() - 1];
    for (int i = 0; i < parameters.length; i++) {
      parameters[i] = define(scope, arguments.get(i));
    }
    scopes.push(scope);
    Node body = compiler.node(arguments.get(arguments.size() - 1), true);
    scopes.pop();
    return new LambdaNode(parameters, body);
  }
}
