package weighhouse.rules.pattern;

import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.quantity.Kind;

/**
 * A pattern with what its metavariables may stand for.
 *
 * @param pattern the function looked for
 * @param where its metavariables by name
 * @param cell what the host cell must be; null for any. A pattern that speaks of its cell must be
 *     the whole formula
 * @param unless functions of the same operands that excuse it where any part of the formula is one
 * @param beside kinds of which no further factor may be
 * @param correction what should stand instead, null where the rule cannot tell
 * @param level severity of its matches; null for the rule's own
 */
public record TypedPattern(
    Pattern pattern,
    Map<String, Metavariable> where,
    Metavariable cell,
    List<Pattern> unless,
    Set<Kind> beside,
    Expr correction,
    String level) {}
