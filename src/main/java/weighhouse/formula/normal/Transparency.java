package weighhouse.formula.normal;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;

/** Decides which calls mean, for the algebra, no more than one of their arguments. */
@FunctionalInterface
public interface Transparency {
  /** Every call is taken as it is. */
  Transparency NONE = call -> Optional.empty();

  /** Rounding, bounds to [0, 1], caught errors, conversions to a number, and switches. */
  Transparency USUAL =
      call -> Usual.WRAPPERS.getOrDefault(call.function(), c -> Optional.empty()).apply(call);

  /** The argument that the call stands for, or empty if the call is an operation of its own. */
  Optional<Expr> operand(Expr.Call call);

  /** The wrappers modellers put around an operand. */
  final class Usual {
    private static final Map<String, Function<Expr.Call, Optional<Expr>>> WRAPPERS =
        Map.ofEntries(
            Map.entry("ROUND", Usual::first),
            Map.entry("ROUNDUP", Usual::first),
            Map.entry("ROUNDDOWN", Usual::first),
            Map.entry("N", Usual::first),
            Map.entry("VALUE", Usual::first),
            Map.entry("NUMBERVALUE", Usual::first),
            Map.entry("IFERROR", call -> besideConstant(call.arguments())),
            Map.entry("IFNA", call -> besideConstant(call.arguments())),
            Map.entry("MIN", call -> besideBound(call, 1)),
            Map.entry("MAX", call -> besideBound(call, 0)),
            Map.entry("IF", call -> besideConstant(afterFirst(call))),
            Map.entry("CHOOSE", call -> besideConstant(afterFirst(call))));

    private Usual() {}

    private static Optional<Expr> first(Expr.Call call) {
      return call.arguments().stream().findFirst();
    }

    private static List<Expr> afterFirst(Expr.Call call) {
      return call.arguments()
          .subList(Math.min(1, call.arguments().size()), call.arguments().size());
    }

    /** The only one of some alternatives that is no literal. */
    private static Optional<Expr> besideConstant(List<Expr> alternatives) {
      List<Expr> open = alternatives.stream().filter(node -> !isLiteral(node)).toList();
      return open.size() == 1 ? Optional.of(open.get(0)) : Optional.empty();
    }

    private static Optional<Expr> besideBound(Expr.Call call, double bound) {
      boolean bounded =
          call.arguments().size() == 2
              && call.arguments().stream()
                  .anyMatch(node -> Trees.inside(node) instanceof Expr.Num n && n.value() == bound);
      return bounded ? besideConstant(call.arguments()) : Optional.empty();
    }

    private static boolean isLiteral(Expr node) {
      Expr inner = Trees.inside(node);
      if (inner instanceof Expr.Unary unary) {
        return isLiteral(unary.operand());
      }
      return inner instanceof Expr.Num
          || inner instanceof Expr.Str
          || inner instanceof Expr.Bool
          || inner instanceof Expr.Missing
          || inner instanceof Expr.ErrorLiteral
          || (inner instanceof Expr.Call call && call.function().equals("NA"));
    }
  }
}
