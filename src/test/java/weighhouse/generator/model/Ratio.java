package weighhouse.generator.model;

/** An effect measure's printed figures. */
public record Ratio(
    Measure measure, double value, double lower, double upper, double standardError) {
  /** A value with a 95 % interval around it. */
  public static Ratio draw(Measure measure, Dice dice) {
    double value = measure.draw(dice);
    double se = dice.between(0.08, 0.2, 2);
    double wide = 1.959964 * se;
    return measure.isRatio()
        ? new Ratio(
            measure,
            value,
            Dice.round(value * Math.exp(-wide), 4),
            Dice.round(value * Math.exp(wide), 4),
            se)
        : new Ratio(
            measure,
            value,
            Dice.round(value - wide * value, 4),
            Dice.round(value + wide * value, 4),
            Dice.round(se * value, 4));
  }
}
