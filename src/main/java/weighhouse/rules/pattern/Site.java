package weighhouse.rules.pattern;

import java.util.List;
import weighhouse.formula.Expr;

/**
 * The part of a formula that a correction replaces.
 *
 * @param node the whole product or sum
 * @param kept factors that have nothing to do with the operands and stay
 * @param dropped whether the correction takes the place of a product's factors (else of addends)
 */
record Site(Expr node, List<Factor> kept, boolean dropped) {}
