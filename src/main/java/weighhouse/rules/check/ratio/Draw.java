package weighhouse.rules.check.ratio;

import weighhouse.formula.Expr;
import weighhouse.formula.Trees;

/**
 * A draw from a normal distribution, or from a log-normal one, as a formula writes it.
 *
 * @param node all of it
 * @param logNormal whether what comes out is the exponential of a normal draw
 * @param level the uniform number, null where a standard normal one is used instead
 * @param standard the standard normal number, or null
 * @param location mean of the normal distribution
 * @param spread its standard deviation
 */
public record Draw(
    Expr node, boolean logNormal, Expr level, Expr standard, Expr location, Expr spread) {

  /** The same draw from a log-normal distribution with these parameters. */
  public Expr logNormal(Expr newLocation, Expr newSpread) {
    if (standard != null) {
      return Refs.call("EXP", Refs.plus(newLocation, Refs.times(newSpread, standard)));
    }
    boolean named =
        Trees.inside(node) instanceof Expr.Call call && !call.function().equals("EXP") && logNormal;
    Expr.Call call = (Expr.Call) Trees.inside(node);
    if (named) {
      return Refs.call(call.function(), level, newLocation, newSpread);
    }
    Expr.Call normal = logNormal ? (Expr.Call) Trees.inside(call.arguments().get(0)) : call;
    return Refs.call("EXP", Refs.call(normal.function(), level, newLocation, newSpread));
  }
}
