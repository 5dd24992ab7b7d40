package weighhouse.rules.pattern;

import java.util.Map;
import java.util.function.ToDoubleFunction;
import weighhouse.formula.Expr;

/**
 * A formula with what a pattern's metavariables stand for in it.
 *
 * @param view the formula
 * @param bounds by metavariable
 * @param values the present value of an expression in the host; NaN where it has none
 */
public record Situation(
    FormulaView view, Map<String, Bound> bounds, ToDoubleFunction<Expr> values) {}
