package weighhouse.formula.normal;

/** How far a formula is taken apart. */
public enum Level {
  /** Flattened and ordered; a sum inside a product stays together as one factor. */
  AS_WRITTEN,
  /** Products of sums multiplied out, then what all terms share taken out in front. */
  EXPANDED
}
