/**
 * The laws of effect measures and the arithmetic of probabilities, rates, hazards and odds, as pure
 * functions on numbers. Start at {@link weighhouse.effect.Probability} for single steps, at {@link
 * weighhouse.effect.EffectMeasure} for what a measure does, at {@link weighhouse.effect.Scale} for
 * which ratio did act.
 *
 * <p>Knows no workbook, formula, cell or label; needs nothing beyond Commons Math. Numbers outside
 * a function's domain give NaN, since inputs come from other people's files and one bad cell must
 * not stop the rest; lists and matrices of the wrong size throw {@link IllegalArgumentException}.
 * Keys such as {@code zhang-yu-1998} name the sources in {@code rules/sources.yaml}.
 *
 * <p>Parametric curves are in {@code effect.curve}, transition matrices in {@code effect.matrix},
 * times to event in {@code effect.survival}, standard errors, intervals and pooling in {@code
 * effect.estimate}.
 */
package weighhouse.effect;
