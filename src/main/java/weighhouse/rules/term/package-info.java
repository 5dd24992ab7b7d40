/**
 * The algebra behind a formula. Expressions become terms in which writing does not matter (PRODUCT
 * or asterisk, percent, order of operands, a helper cell's formula in place of its reference), and
 * two terms are held to be the same function when they give the same numbers at sampled points. No
 * rule and no kind of quantity is known here. Continue at {@code weighhouse.rules.pattern}.
 */
package weighhouse.rules.term;
