package weighhouse.effect;

import java.util.Arrays;

/**
 * Several exits from one state within a cycle, each with a cause-specific hazard that is constant
 * over the cycle or in constant proportion to the others. No way back within the cycle is counted;
 * for that use the exponential of the generator in {@code effect.matrix}.
 *
 * <p>Rows that cannot be read give NaN in every entry. Sources: graves-2021; for chains
 * jones-epstein-garcia-mochon-2017.
 */
public final class CompetingExits {
  private CompetingExits() {}

  /**
   * Probabilities of the exits: {@code h_i / sum(h) * (1 - exp(-sum(h)))}.
   *
   * @param hazards cumulative cause-specific hazards over the cycle (rate times its length), each
   *     at least 0
   */
  public static double[] probabilities(double... hazards) {
    double total = Arrays.stream(hazards).sum();
    double share = total == 0 ? 1 : Probability.ofCumulativeHazard(total) / total;
    return Arrays.stream(hazards).map(h -> h >= 0 ? h * share : Double.NaN).toArray();
  }

  /**
   * The cumulative cause-specific hazards behind the exits of a row: {@code -ln(stay) * p_i / (1 -
   * stay)} with {@code stay = 1 - sum(p)}.
   *
   * @param exits probabilities of the exits, each at least 0, their sum below 1
   */
  public static double[] hazards(double... exits) {
    double leave = Arrays.stream(exits).sum();
    double share = leave == 0 ? 1 : Probability.toCumulativeHazard(leave) / leave;
    boolean readable = leave < 1 && Arrays.stream(exits).allMatch(Domain::isNonNegative);
    return Arrays.stream(exits).map(p -> readable ? p * share : Double.NaN).toArray();
  }

  /**
   * The exits after a ratio acted on the hazard of one of them, the others' hazards unchanged;
   * their probabilities move a little, since fewer or more leave by the first.
   *
   * @param exits probabilities of the exits, their sum below 1
   * @param index the exit that the ratio acts on
   * @param ratio at least 0
   */
  public static double[] scaleHazard(double[] exits, int index, double ratio) {
    double[] hazards = hazards(exits);
    hazards[index] *= ratio;
    return probabilities(hazards);
  }

  /**
   * The ratio that acted on the hazard of one exit between two rows.
   *
   * @param with exits with the effect
   * @param without exits without it
   */
  public static double hazardRatio(double[] with, double[] without, int index) {
    return hazards(with)[index] / hazards(without)[index];
  }

  /** The chance of staying: 1 less the sum of the exits; below 0 where they exceed 1. */
  public static double stay(double... exits) {
    return 1 - Arrays.stream(exits).sum();
  }
}
