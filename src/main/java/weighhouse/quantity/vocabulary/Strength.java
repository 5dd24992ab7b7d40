package weighhouse.quantity.vocabulary;

/** How far a word alone decides what a number is, from least to most. */
public enum Strength {
  /** Common words of other meanings too; gives way to everything. */
  WEAK(0),
  /** Usage may say otherwise. */
  FAIR(1),
  /** What modellers usually mean by it. */
  CLEAR(2),
  /** Can mean nothing else. */
  EXPLICIT(3);

  private final int level;

  Strength(int level) {
    this.level = level;
  }

  /** 0 for the weakest. */
  public int level() {
    return level;
  }

  /** The strength of that level. */
  public static Strength ofLevel(int level) {
    return level <= 0 ? WEAK : level == 1 ? FAIR : level == 2 ? CLEAR : EXPLICIT;
  }

  /** A step less, if there is one. */
  Strength less() {
    return ofLevel(level - 1);
  }

  public boolean atLeast(Strength other) {
    return level >= other.level;
  }
}
