package weighhouse.effect.matrix;

/** What became of a search for the root of a transition matrix. */
public enum RootVerdict {
  /** The principal root is a transition matrix. */
  VALID("the root is a transition matrix"),
  /** The principal root has negative entries, so it is no transition matrix. */
  NEGATIVE_ENTRIES("the root has negative entries"),
  /** A negative eigenvalue: the principal logarithm and root are not real. */
  NO_REAL_LOGARITHM("a negative eigenvalue leaves no real principal logarithm or root"),
  /** An eigenvalue of 0: no logarithm. */
  SINGULAR("the matrix is singular and has no logarithm"),
  /** The calculation did not reach its accuracy. */
  NOT_CALCULATED("the logarithm could not be calculated to its accuracy");

  private final String text;

  RootVerdict(String text) {
    this.text = text;
  }

  /** The verdict in words, to follow a colon. */
  public String text() {
    return text;
  }
}
