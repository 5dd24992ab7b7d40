package weighhouse.formula.normal;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.UnaryOp;
import weighhouse.formula.normal.Normaliser.Scope;

/** One walk through one formula. */
final class Conversion {
  /** Deeper parts are kept as they are: nothing that a person wrote goes so deep. */
  private static final int MAX_DEPTH = 400;

  private static final Coefficient PERCENT = Coefficient.of(0.01);
  private static final Set<String> ON_ARRAYS =
      Set.of("SUMPRODUCT", "MMULT", "MINVERSE", "TRANSPOSE", "LOOKUP", "FILTER", "AGGREGATE");

  private final Normaliser settings;
  private final Origins origins;
  private final Arithmetic by;
  private final ReferenceConversion references;
  private int volatileCalls;

  Conversion(Normaliser settings, Origins origins) {
    this.settings = settings;
    this.origins = origins;
    this.by = new Arithmetic(settings.level());
    this.references = new ReferenceConversion(settings, this);
  }

  Poly convert(Expr node, Scope scope) {
    Poly poly =
        scope.depth() > MAX_DEPTH
            ? Poly.of(new Atom.Other(new Expr.ErrorLiteral("too deep"), null))
            : unrecorded(node, scope.deeper());
    return recorded(poly, node, scope);
  }

  private Poly recorded(Poly poly, Expr node, Scope scope) {
    if (poly.constant().isEmpty()) {
      origins.add(poly, new Hosted(node, scope.host()));
      Poly finished = by.finish(poly);
      if (!finished.equals(poly)) {
        origins.add(finished, new Hosted(node, scope.host()));
      }
    }
    return poly;
  }

  private Poly unrecorded(Expr node, Scope scope) {
    if (node instanceof Expr.Num number) {
      return Poly.constant(Coefficient.of(number.value()));
    } else if (node instanceof Expr.Paren paren) {
      return convert(paren.inner(), scope);
    } else if (node instanceof Expr.Unary unary) {
      return unary(unary, scope);
    } else if (node instanceof Expr.Binary binary) {
      return binary(binary, scope);
    } else if (node instanceof Expr.Call call) {
      return call(call, scope);
    } else if (node instanceof Expr.SpillRef spill) {
      return function("#", List.of(convert(spill.anchor(), scope)));
    } else if (isLiteral(node)) {
      return Poly.of(new Atom.Other(node, null));
    }
    return references.convert(node, scope);
  }

  private static boolean isLiteral(Expr node) {
    return node instanceof Expr.Str
        || node instanceof Expr.Bool
        || node instanceof Expr.ErrorLiteral
        || node instanceof Expr.Missing
        || node instanceof Expr.ArrayLiteral;
  }

  private Poly unary(Expr.Unary unary, Scope scope) {
    if (unary.op() == UnaryOp.MINUS) {
      return by.negate(convert(unary.operand(), scope));
    } else if (unary.op() == UnaryOp.PERCENT) {
      return by.multiply(Poly.constant(PERCENT), convert(unary.operand(), scope));
    } else if (unary.op() == UnaryOp.AT) {
      Scope intersecting = new Scope(scope.host(), scope.variables(), false, scope.depth());
      return convert(unary.operand(), intersecting);
    }
    return convert(unary.operand(), scope);
  }

  /** Follows the left spine in a loop: a sum of thousands of terms is as many levels deep. */
  private Poly binary(Expr.Binary outermost, Scope scope) {
    Deque<Expr.Binary> spine = new ArrayDeque<>();
    spine.push(outermost);
    while (spine.peek().left() instanceof Expr.Binary inner) {
      spine.push(inner);
    }
    Poly left = convert(spine.peek().left(), scope);
    while (!spine.isEmpty()) {
      Expr.Binary binary = spine.pop();
      left = apply(binary.op(), left, convert(binary.right(), scope));
      if (!spine.isEmpty()) {
        recorded(left, binary, scope);
      }
    }
    return left;
  }

  private Poly apply(BinaryOp op, Poly left, Poly right) {
    return switch (op) {
      case ADD -> by.add(left, right);
      case SUBTRACT -> by.subtract(left, right);
      case MULTIPLY -> by.multiply(left, right);
      case DIVIDE -> right.isZero() ? function("/", List.of(left, right)) : by.divide(left, right);
      case POWER -> by.power(left, right);
      case GREATER -> function("<", List.of(right, left));
      case GREATER_OR_EQUAL -> function("<=", List.of(right, left));
      case EQUAL, NOT_EQUAL -> {
        boolean ordered = left.key().compareTo(right.key()) <= 0;
        yield function(op.symbol(), ordered ? List.of(left, right) : List.of(right, left));
      }
      default -> function(op.symbol(), List.of(left, right));
    };
  }

  private Poly function(String name, List<Poly> arguments) {
    return Poly.of(new Atom.Function(name, arguments.stream().map(by::finish).toList()));
  }

  private Poly call(Expr.Call call, Scope scope) {
    Optional<Expr> operand = settings.transparency().operand(call);
    if (operand.isPresent()) {
      return convert(operand.get(), scope);
    } else if (call.function().equals("LET")) {
      return let(call.arguments(), scope);
    }
    String name = call.function();
    if (FunctionFolding.isVolatile(name)) {
      name = name + "~" + ++volatileCalls;
    }
    Scope inside = ON_ARRAYS.contains(name) ? scope.onArrays() : scope;
    List<Poly> arguments = new ArrayList<>();
    for (Expr argument : call.arguments()) {
      boolean whole = !FunctionFolding.isScalar(name) && ReferenceConversion.isReference(argument);
      arguments.add(convert(argument, whole ? inside.onArrays() : inside));
    }
    return FunctionFolding.call(by, name, arguments);
  }

  private Poly let(List<Expr> arguments, Scope scope) {
    Map<String, Poly> variables = new HashMap<>(scope.variables());
    Scope inner = scope.with(variables);
    for (int i = 0; i + 1 < arguments.size(); i += 2) {
      if (arguments.get(i) instanceof Expr.NameRef name) {
        Poly value = convert(arguments.get(i + 1), inner);
        variables.put(name.name().toUpperCase(Locale.ROOT), value);
      }
    }
    return arguments.isEmpty()
        ? function("LET", List.of())
        : convert(arguments.get(arguments.size() - 1), inner);
  }
}
