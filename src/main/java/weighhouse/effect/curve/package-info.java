/**
 * Parametric survival curves: survival and hazards over time, the parameter that carries a hazard
 * ratio, and effects that fade. Start at {@link weighhouse.effect.curve.Curve}.
 *
 * <p>Curves only, with their parameters given; fitting them to data is in {@code effect.survival}.
 * Parameters outside their domain throw {@link IllegalArgumentException} when the curve is made;
 * times below 0 give NaN.
 */
package weighhouse.effect.curve;
