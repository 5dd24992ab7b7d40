package weighhouse.quantity;

/** Which figure of an estimate a cell holds. */
public enum Role {
  ESTIMATE,
  LOWER_LIMIT,
  UPPER_LIMIT,
  STANDARD_ERROR,
  /** A random draw of the estimate. */
  DRAW
}
