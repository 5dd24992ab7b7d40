package weighhouse.formula.normal;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Functions that are arithmetic under another name. */
final class FunctionFolding {
  /** Functions that take one value where a column is given: implicit intersection applies. */
  private static final Set<String> SCALAR =
      Set.of(
          "EXP",
          "LN",
          "LOG",
          "LOG10",
          "SQRT",
          "POWER",
          "ABS",
          "INT",
          "ROUND",
          "ROUNDUP",
          "ROUNDDOWN",
          "IF",
          "IFERROR",
          "IFNA",
          "N",
          "VALUE",
          "MOD",
          "SIN",
          "COS",
          "NORM.S.DIST",
          "NORMSDIST",
          "NORM.S.INV",
          "NORMSINV",
          "GAMMALN");

  /** Functions whose result does not depend on the order of arguments. */
  private static final Set<String> COMMUTATIVE =
      Set.of("SUMPRODUCT", "MIN", "MAX", "AND", "OR", "AVERAGE", "GEOMEAN", "PRODUCT");

  /** Functions that give one number for whole areas. */
  private static final Set<String> AGGREGATES =
      Set.of(
          "SUM",
          "SUMPRODUCT",
          "MIN",
          "MAX",
          "AVERAGE",
          "COUNT",
          "GEOMEAN",
          "VLOOKUP",
          "HLOOKUP",
          "XLOOKUP",
          "INDEX",
          "MATCH",
          "SUMIF",
          "SUMIFS");

  /** Functions that give another number each time. */
  private static final Set<String> VOLATILE = Set.of("RAND", "RANDBETWEEN", "RANDARRAY");

  @FunctionalInterface
  private interface Fold {
    Optional<Poly> apply(Arithmetic by, List<Poly> arguments);
  }

  private static final Map<String, Fold> FOLDS =
      Map.ofEntries(
          Map.entry("PRODUCT", FunctionFolding::product),
          Map.entry("SUMPRODUCT", FunctionFolding::product),
          Map.entry("SUM", FunctionFolding::sum),
          Map.entry(
              "POWER", (by, a) -> a.size() == 2 ? some(by.power(a.get(0), a.get(1))) : none()),
          Map.entry("SQRT", (by, a) -> one(a).map(x -> by.power(x, half()))),
          Map.entry("EXP", (by, a) -> one(a).map(by::exp)),
          Map.entry("LN", (by, a) -> one(a).map(by::ln)),
          Map.entry("LOG", FunctionFolding::log),
          Map.entry("PI", (by, a) -> some(Poly.constant(Coefficient.of(Math.PI)))));

  private FunctionFolding() {}

  static boolean isScalar(String function) {
    return SCALAR.contains(function);
  }

  static boolean isVolatile(String function) {
    return VOLATILE.contains(function);
  }

  /** The call in normal form; an atom unless the function is plain arithmetic. */
  static Poly call(Arithmetic by, String function, List<Poly> arguments) {
    return Optional.ofNullable(FOLDS.get(function))
        .flatMap(fold -> fold.apply(by, arguments))
        .orElseGet(() -> atom(by, function, arguments));
  }

  private static Poly atom(Arithmetic by, String function, List<Poly> arguments) {
    List<Poly> finished = arguments.stream().map(by::finish).toList();
    List<Poly> ordered =
        COMMUTATIVE.contains(function)
            ? finished.stream().sorted(java.util.Comparator.comparing(Poly::key)).toList()
            : finished;
    return Poly.of(new Atom.Function(function, ordered));
  }

  private static Optional<Poly> product(Arithmetic by, List<Poly> arguments) {
    if (arguments.isEmpty() || !arguments.stream().allMatch(FunctionFolding::isNumber)) {
      return none();
    }
    return some(arguments.stream().reduce(Poly.ONE, by::multiply));
  }

  private static Optional<Poly> sum(Arithmetic by, List<Poly> arguments) {
    Poly sum = Poly.ZERO;
    for (Poly argument : arguments) {
      sum = by.add(sum, isNumber(argument) ? argument : atom(by, "SUM", List.of(argument)));
    }
    return some(sum);
  }

  private static Optional<Poly> log(Arithmetic by, List<Poly> arguments) {
    if (arguments.size() != 2 || arguments.get(1).equals(Poly.constant(Coefficient.of(10)))) {
      return arguments.isEmpty() ? none() : some(atom(by, "LOG10", arguments.subList(0, 1)));
    }
    return some(by.divide(by.ln(arguments.get(0)), by.ln(arguments.get(1))));
  }

  /** Whether an argument is one number: no area, text or omitted argument in it. */
  private static boolean isNumber(Poly argument) {
    return argument.terms().stream()
        .flatMap(term -> term.factors().keySet().stream())
        .allMatch(FunctionFolding::isNumber);
  }

  private static boolean isNumber(Atom atom) {
    if (atom instanceof Atom.Sum sum) {
      return isNumber(sum.sum());
    } else if (atom instanceof Atom.Function function) {
      return AGGREGATES.contains(function.name())
          || function.arguments().stream().allMatch(FunctionFolding::isNumber);
    }
    return !(atom instanceof Atom.Area || atom instanceof Atom.Other);
  }

  private static Poly half() {
    return Poly.constant(Coefficient.of(0.5));
  }

  private static Optional<Poly> one(List<Poly> arguments) {
    return arguments.size() == 1 ? Optional.of(arguments.get(0)) : none();
  }

  private static Optional<Poly> some(Poly poly) {
    return Optional.of(poly);
  }

  private static Optional<Poly> none() {
    return Optional.empty();
  }
}
