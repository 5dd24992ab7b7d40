package weighhouse.recalculate.functions;

/**
 * How a function takes its arguments, one letter each: V a value (a range intersects with the
 * caller's row or column, an array calls the function once for each element), R a range as it is, A
 * an array (operators inside work on whole ranges), N a range whose cells are not read. Small
 * letters may be left out. A final {@code +} repeats the last letter, {@code ++} the last two.
 */
public record Signature(String letters, int least, int most, int repeats) {
  private static final int MOST = 255;

  static Signature of(String text) {
    String letters = text.replace("+", "");
    int repeats = text.length() - letters.length();
    int least = (int) letters.chars().filter(Character::isUpperCase).count();
    int most = repeats > 0 ? MOST : letters.length();
    return new Signature(letters.toUpperCase(java.util.Locale.ROOT), least, most, repeats);
  }

  /** V, R, A or N. */
  public char kind(int argument) {
    int length = letters.length();
    if (argument < length) {
      return letters.charAt(argument);
    }
    return letters.charAt(length - repeats + (argument - length) % Math.max(1, repeats));
  }

  public boolean accepts(int arguments) {
    return arguments >= least && arguments <= most;
  }
}
