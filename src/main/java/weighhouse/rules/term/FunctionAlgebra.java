package weighhouse.rules.term;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BinaryOperator;
import weighhouse.formula.Expr;

/** The worksheet functions that are algebra, or that pass on one of their arguments. */
final class FunctionAlgebra {
  private FunctionAlgebra() {}

  static Term of(Expr.Call call, Translator translator) {
    Terms terms = translator.terms();
    List<Expr> arguments = call.arguments();
    return switch (call.function()) {
      case "EXP" -> terms.exp(argument(call, 0, translator));
      case "LN" -> terms.ln(argument(call, 0, translator));
      case "LOG10" -> logarithm(argument(call, 0, translator), terms.number(10), terms);
      case "LOG" -> logarithm(call, translator);
      case "SQRT" -> terms.power(argument(call, 0, translator), terms.number(0.5));
      case "POWER" -> terms.power(argument(call, 0, translator), argument(call, 1, translator));
      case "PRODUCT" -> fold(call, translator, terms::product);
      case "SUMPRODUCT" ->
          arguments.stream().allMatch(FunctionAlgebra::isSingle)
              ? fold(call, translator, terms::product)
              : opaque(call, translator);
      case "SUM" -> fold(call, translator, terms::sum);
      case "ABS" -> terms.apply(Operation.ABS, List.of(argument(call, 0, translator)));
      case "MIN" -> bounded(call, Operation.MIN, translator);
      case "MAX" -> bounded(call, Operation.MAX, translator);
      case "IFERROR", "IFNA", "ROUND", "ROUNDUP", "ROUNDDOWN", "N", "VALUE", "SINGLE" ->
          arguments.isEmpty() ? opaque(call, translator) : firstOf(call, translator);
      case "IF", "CHOOSE" ->
          arguments.size() < 2
              ? opaque(call, translator)
              : terms.apply(Operation.SELECT, translated(arguments, translator));
      case "LET" -> let(arguments, translator);
      case "WEIBULL", "WEIBULL.DIST", "EXPONDIST", "EXPON.DIST" ->
          Distributions.of(call, translator);
      default -> opaque(call, translator);
    };
  }

  private static boolean isSingle(Expr argument) {
    return !(argument instanceof Expr.AreaRef)
        && !(argument instanceof Expr.ColumnsRef)
        && !(argument instanceof Expr.RowsRef);
  }

  private static Term argument(Expr.Call call, int index, Translator translator) {
    return index < call.arguments().size()
        ? translator.of(call.arguments().get(index))
        : translator.terms().number(0);
  }

  private static Term firstOf(Expr.Call call, Translator translator) {
    return translated(call.arguments(), translator).get(0);
  }

  private static Term logarithm(Expr.Call call, Translator translator) {
    Term of = argument(call, 0, translator);
    boolean base = call.arguments().size() > 1;
    Terms terms = translator.terms();
    return logarithm(of, base ? argument(call, 1, translator) : terms.number(10), terms);
  }

  private static Term logarithm(Term of, Term base, Terms terms) {
    return terms.quotient(terms.ln(of), terms.ln(base));
  }

  private static Term fold(Expr.Call call, Translator translator, BinaryOperator<Term> operation) {
    Term result = null;
    for (Expr argument : call.arguments()) {
      List<Expr> cells = translator.cells(argument);
      if (cells.isEmpty()) {
        return opaque(call, translator);
      }
      for (Expr cell : cells) {
        Term term = translator.of(cell);
        result = result == null ? term : operation.apply(result, term);
      }
    }
    return result == null ? translator.terms().number(0) : result;
  }

  /** A bound that is a plain number only cuts off; between the bounds the operand goes through. */
  private static Term bounded(Expr.Call call, Operation operation, Translator translator) {
    List<Term> parts = translated(call.arguments(), translator);
    List<Term> varying = parts.stream().filter(part -> !part.isNumber()).toList();
    if (varying.size() == 1) {
      return varying.get(0);
    }
    return parts.isEmpty() ? opaque(call, translator) : translator.terms().apply(operation, parts);
  }

  private static Term let(List<Expr> arguments, Translator translator) {
    for (int i = 0; i + 1 < arguments.size(); i += 2) {
      translator.define(arguments.get(i), translator.of(arguments.get(i + 1)));
    }
    return translator.of(arguments.get(arguments.size() - 1));
  }

  private static Term opaque(Expr.Call call, Translator translator) {
    return translator.terms().opaque(call.function(), translated(call.arguments(), translator));
  }

  private static List<Term> translated(List<Expr> arguments, Translator translator) {
    List<Term> parts = new ArrayList<>();
    arguments.forEach(argument -> parts.add(translator.of(argument)));
    return parts;
  }
}
