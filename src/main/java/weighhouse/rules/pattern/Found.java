package weighhouse.rules.pattern;

import java.util.Map;
import weighhouse.formula.Expr;

/**
 * A pattern found in a formula.
 *
 * @param pattern which
 * @param operands what its metavariables stand for, relative to the host
 * @param offending the node that is wrong
 * @param suggestion the whole formula with that node corrected, or null
 */
public record Found(
    TypedPattern pattern, Map<String, Expr> operands, Expr offending, Expr suggestion) {}
