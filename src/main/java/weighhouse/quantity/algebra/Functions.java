package weighhouse.quantity.algebra;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import weighhouse.formula.Expr;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** What functions give, from what their arguments are. One table, one line a function. */
final class Functions {
  /** From a call's arguments to what it gives. */
  private interface Rule {
    Term apply(Arguments arguments);
  }

  /** The arguments of one call, read when they are asked for. */
  private final class Arguments {
    private final Expr.Call call;
    private final CellAddress host;
    private final int depth;

    Arguments(Expr.Call call, CellAddress host, int depth) {
      this.call = call;
      this.host = host;
      this.depth = depth;
    }

    int count() {
      return call.arguments().size();
    }

    Term term(int index) {
      return index < count()
          ? algebra.term(call.arguments().get(index), host, depth)
          : Term.UNKNOWN;
    }

    List<Term> from(int first, int step) {
      return IntStream.iterate(first, i -> i < count(), i -> i + step)
          .mapToObj(this::term)
          .toList();
    }

    /** The cells that the whole call picks by a literal key, else what it may pick from. */
    Term picked(int area) {
      Optional<CellRange> cells = algebra.operands().cells(call, host);
      return cells
          .map(range -> Term.of(algebra.operands().quantity(range)))
          .orElseGet(() -> term(area));
    }
  }

  private final Algebra algebra;
  private final Map<String, Rule> rules = new HashMap<>();

  Functions(Algebra algebra) {
    this.algebra = algebra;
    selectors();
    arithmetic();
    lookups();
    distributions();
  }

  Term call(Expr.Call call, CellAddress host, int depth) {
    Rule rule = rules.get(call.function());
    return rule == null ? Term.UNKNOWN : rule.apply(new Arguments(call, host, depth));
  }

  private void same(int argument, String... names) {
    for (String name : names) {
      rules.put(name, arguments -> arguments.term(argument).moved());
    }
  }

  private void selectors() {
    rules.put("IF", a -> Selection.of(a.from(1, 1)));
    rules.put("IFS", a -> Selection.of(a.from(1, 2)));
    rules.put("SWITCH", a -> Selection.of(a.from(2, 2)));
    rules.put("CHOOSE", a -> Selection.of(a.from(1, 1)));
    rules.put("IFERROR", a -> Selection.of(a.from(0, 1)));
    rules.put("IFNA", a -> Selection.of(a.from(0, 1)));
    rules.put("MIN", a -> Selection.of(a.from(0, 1)));
    rules.put("MAX", a -> Selection.of(a.from(0, 1)));
    rules.put("MEDIAN", a -> Selection.of(a.from(0, 1)));
    rules.put("AVERAGE", a -> Selection.of(a.from(0, 1)));
    rules.put("LET", a -> a.term(a.count() - 1));
    same(0, "ROUND", "ROUNDUP", "ROUNDDOWN", "ABS", "N", "VALUE", "TRANSPOSE", "SINGLE", "INT");
    same(0, "TRUNC", "AVERAGEIF", "PERCENTILE", "PERCENTILE.INC", "QUARTILE", "SMALL", "LARGE");
    same(0, "GEOMEAN", "MAXIFS", "MINIFS", "AVERAGEIFS");
  }

  private void arithmetic() {
    rules.put("EXP", a -> Powers.exp(a.term(0)));
    rules.put("LN", a -> Powers.ln(a.term(0)));
    rules.put("LOG", a -> Powers.ln(a.term(0)));
    rules.put("LOG10", a -> Powers.ln(a.term(0)));
    rules.put("POWER", a -> Powers.power(a.term(0), a.term(1)));
    rules.put("SQRT", a -> Powers.power(a.term(0), Term.number(0.5)));
    rules.put(
        "PRODUCT", a -> a.from(0, 1).stream().reduce(Products::multiply).orElse(Term.UNKNOWN));
    rules.put("SUM", a -> a.from(0, 1).stream().reduce(Sums::add).orElse(Term.UNKNOWN).moved());
    rules.put("SUMPRODUCT", this::sumProduct);
    rules.put("MMULT", a -> matrixProduct(a.term(0), a.term(1)));
    same(0, "SUMIFS");
    rules.put("SUMIF", a -> a.term(a.count() > 2 ? 2 : 0).moved());
    List.of("ROW", "COLUMN", "ROWS", "COLUMNS", "COUNT", "COUNTA", "COUNTIF", "MATCH", "SEQUENCE")
        .forEach(name -> rules.put(name, a -> Term.of(Kind.COUNT)));
    List.of("STDEV", "STDEV.S", "STDEV.P", "STDEVP")
        .forEach(name -> rules.put(name, a -> Term.of(Kind.STANDARD_ERROR)));
    List.of("AND", "OR", "NOT", "ISNUMBER", "ISERROR", "ISBLANK")
        .forEach(name -> rules.put(name, a -> Term.of(Kind.SWITCH)));
  }

  private Term sumProduct(Arguments arguments) {
    List<Term> factors = arguments.from(0, 1);
    return factors.stream().reduce(Products::multiply).orElse(Term.UNKNOWN).moved();
  }

  private static Term matrixProduct(Term a, Term b) {
    if (a.is(Kind.OCCUPANCY) || b.is(Kind.OCCUPANCY)) {
      Term other = a.is(Kind.OCCUPANCY) ? b : a;
      return Products.multiply(Term.of(Kind.OCCUPANCY), other);
    }
    return a.kind() == b.kind() ? a.moved().over(null) : Products.multiply(a, b);
  }

  private void lookups() {
    rules.put("VLOOKUP", a -> a.picked(1));
    rules.put("HLOOKUP", a -> a.picked(1));
    rules.put("XLOOKUP", a -> a.picked(2));
    rules.put("LOOKUP", a -> a.picked(a.count() > 2 ? 2 : 1));
    rules.put("INDEX", a -> a.picked(0));
    rules.put("OFFSET", a -> a.picked(0));
    rules.put("INDIRECT", a -> a.picked(1));
  }

  private void distributions() {
    rules.put("RAND", a -> Term.UNKNOWN.as(Role.DRAW));
    rules.put("RANDBETWEEN", a -> Term.UNKNOWN.as(Role.DRAW));
    List.of("NORM.INV", "NORMINV")
        .forEach(name -> rules.put(name, a -> quantile(a.term(0), a.term(1))));
    List.of("LOGNORM.INV", "LOGINV")
        .forEach(name -> rules.put(name, a -> quantile(a.term(0), logNormal(a.term(1)))));
    List.of("BETA.INV", "BETAINV").forEach(name -> rules.put(name, a -> drawn(a, Kind.UNKNOWN)));
    List.of("GAMMA.INV", "GAMMAINV").forEach(name -> rules.put(name, a -> drawn(a, Kind.UNKNOWN)));
    List.of("WEIBULL.DIST", "WEIBULL", "EXPON.DIST", "EXPONDIST", "LOGNORM.DIST", "LOGNORMDIST")
        .forEach(name -> rules.put(name, a -> Term.of(Kind.PROBABILITY)));
  }

  /** The quantile of a distribution: of the mean's kind, and a draw if the level is random. */
  private static Term quantile(Term level, Term mean) {
    Term value = mean.moved();
    return level.quantity().role() == Role.DRAW ? value.as(Role.DRAW) : value;
  }

  private static Term logNormal(Term location) {
    return location.in(Kinds.LOGS) ? Powers.exp(location) : location;
  }

  private static Term drawn(Arguments arguments, Kind kind) {
    Role level = arguments.term(0).quantity().role();
    Role role = level == Role.DRAW ? Role.DRAW : Role.ESTIMATE;
    return Term.of(new Quantity(kind, role, null));
  }
}
