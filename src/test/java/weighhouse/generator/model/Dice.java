package weighhouse.generator.model;

import java.util.List;
import java.util.SplittableRandom;

/** Repeatable choices from a seed. */
public final class Dice {
  private final SplittableRandom random;

  /** Choices that depend on the seed alone. */
  public Dice(long seed) {
    random = new SplittableRandom(seed);
  }

  /** Any element. */
  public <T> T pick(List<T> from) {
    return from.get(random.nextInt(from.size()));
  }

  /** From {@code low} to {@code high}, both included. */
  public int between(int low, int high) {
    return random.nextInt(low, high + 1);
  }

  /** Uniform, rounded to {@code digits} decimals. */
  public double between(double low, double high, int digits) {
    return round(random.nextDouble(low, high), digits);
  }

  /** True with this chance. */
  public boolean chance(double probability) {
    return random.nextDouble() < probability;
  }

  /** Standard normal. */
  public double normal() {
    return Math.sqrt(-2 * Math.log(1 - random.nextDouble()))
        * Math.cos(2 * Math.PI * random.nextDouble());
  }

  /** Exponential with a rate. */
  public double exponential(double rate) {
    return -Math.log(1 - random.nextDouble()) / rate;
  }

  /** A number rounded to some decimals. */
  public static double round(double value, int digits) {
    double power = Math.pow(10, digits);
    return Math.round(value * power) / power;
  }
}
