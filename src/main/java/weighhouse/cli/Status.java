package weighhouse.cli;

/** Exit statuses. */
final class Status {
  /** Audited, or passed. */
  static final int PASS = 0;

  /** Held by the gate. */
  static final int HELD = 1;

  /** Wrong use, or input that cannot be read. */
  static final int UNUSABLE = 2;

  /** Less was analysed than the brief demands. */
  static final int INCOMPLETE = 3;

  private Status() {}

  /** The status of several workbooks: what could not be read or analysed outranks what was held. */
  static int worst(int one, int other) {
    return rank(one) >= rank(other) ? one : other;
  }

  private static int rank(int status) {
    return switch (status) {
      case UNUSABLE -> 3;
      case INCOMPLETE -> 2;
      default -> status;
    };
  }
}
