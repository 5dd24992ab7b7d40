package weighhouse.rules.term;

import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Supplier;
import weighhouse.formula.Expr;
import weighhouse.workbook.CellAddress;

/** From expressions to terms. */
public final class Translator {
  private final Terms terms;
  private final Scope scope;
  private final IdentityHashMap<Expr, Term> given;
  private final Map<String, Term> variables = new HashMap<>();
  private final Map<Object, Term> found = new HashMap<>();
  private final Map<Term, Origin> origins = new HashMap<>();
  private IdentityHashMap<Expr, Term> recorded = new IdentityHashMap<>();
  private CellAddress host;

  public Translator(Terms terms, Scope scope) {
    this(terms, scope, new IdentityHashMap<>());
  }

  /**
   * @param given nodes, by identity, that are to stand for other terms than their own
   */
  public Translator(Terms terms, Scope scope, IdentityHashMap<Expr, Term> given) {
    this.terms = terms;
    this.scope = scope;
    this.given = new IdentityHashMap<>(given);
  }

  public Terms terms() {
    return terms;
  }

  /** The term of an expression in the host cell. */
  public Term translate(Expr expression, CellAddress in) {
    CellAddress before = host;
    host = in;
    Term term = of(expression);
    host = before;
    return term;
  }

  /** The term of what a reference leads to; its nodes are not recorded. */
  public Term elsewhere(Expr expression, CellAddress in) {
    IdentityHashMap<Expr, Term> own = recorded;
    recorded = new IdentityHashMap<>();
    Term term = translate(expression, in);
    recorded = own;
    return term;
  }

  /** A term worked out once for each symbol; the symbol itself where it leads back to itself. */
  public Term once(Object symbol, Supplier<Term> work) {
    Term known = found.get(symbol);
    if (known == null) {
      found.put(symbol, terms.symbol(symbol));
      known = work.get();
      found.put(symbol, known);
    }
    return known;
  }

  /** Where each term was read first. */
  public Map<Term, Origin> origins() {
    return origins;
  }

  /** An expression and the cell that hosts it. */
  public record Origin(Expr expression, CellAddress host) {}

  /** The nodes translated so far, by identity. */
  public IdentityHashMap<Expr, Term> recorded() {
    return recorded;
  }

  Term of(Expr node) {
    Term term = given.get(node);
    if (term == null) {
      term = compute(node);
    }
    recorded.put(node, term);
    origins.putIfAbsent(term, new Origin(node, host));
    return term;
  }

  private Term compute(Expr node) {
    if (node instanceof Expr.Paren paren) {
      return of(paren.inner());
    } else if (node instanceof Expr.Num number) {
      return terms.number(number.value());
    } else if (node instanceof Expr.Missing) {
      return terms.number(0);
    } else if (node instanceof Expr.Unary unary) {
      return unary(unary);
    } else if (node instanceof Expr.Binary binary) {
      return binary(binary);
    } else if (node instanceof Expr.Call call) {
      return FunctionAlgebra.of(call, this);
    } else if (node instanceof Expr.NameRef name && variable(name) != null) {
      return variable(name);
    } else if (node instanceof Expr.Bool bool) {
      return terms.number(bool.value() ? 1 : 0);
    }
    return scope.term(node, host, this);
  }

  private Term unary(Expr.Unary unary) {
    Term inner = of(unary.operand());
    return switch (unary.op()) {
      case PLUS, AT -> inner;
      case MINUS -> terms.negative(inner);
      case PERCENT -> terms.product(terms.number(0.01), inner);
    };
  }

  private Term binary(Expr.Binary binary) {
    Term left = of(binary.left());
    Term right = of(binary.right());
    return switch (binary.op()) {
      case ADD -> terms.sum(left, right);
      case SUBTRACT -> terms.difference(left, right);
      case MULTIPLY -> terms.product(left, right);
      case DIVIDE -> terms.quotient(left, right);
      case POWER -> terms.power(left, right);
      default -> terms.opaque(binary.op().symbol(), List.of(left, right));
    };
  }

  /** The single cells of an argument: itself unless it is an area. */
  List<Expr> cells(Expr argument) {
    boolean area = argument instanceof Expr.AreaRef;
    return area ? scope.cells(argument, host) : List.of(argument);
  }

  void define(Expr name, Term value) {
    if (name instanceof Expr.NameRef variable) {
      variables.put(variable.name().toLowerCase(Locale.ROOT), value);
    }
  }

  private Term variable(Expr.NameRef name) {
    return name.sheet() == null ? variables.get(name.name().toLowerCase(Locale.ROOT)) : null;
  }
}
