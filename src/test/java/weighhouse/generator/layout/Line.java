package weighhouse.generator.layout;

/**
 * One quantity along the cycles.
 *
 * @param key how other lines refer to it: at sign and key in the same cycle, less-than sign and key
 *     in the one before, between braces
 * @param first formula or number of cycle 0, or null for an empty cell
 * @param next formula of every later cycle
 * @param root event whose fault the line is the root of, or null
 */
record Line(String key, String label, String first, String next, String root) {
  static Line of(String key, String label, String first, String next) {
    return new Line(key, label, first, next, null);
  }
}
