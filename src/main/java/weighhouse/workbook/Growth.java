package weighhouse.workbook;

/** How far arrays grow when they are full. */
final class Growth {
  private Growth() {}

  /**
   * A length of at least {@code need}, half as much again as the present one where that is more.
   */
  static int atLeast(int length, int need) {
    return (int) Math.min(Integer.MAX_VALUE - 8L, Math.max(need, length + (length >> 1) + 16L));
  }
}
