package weighhouse.workbook;

/** Excel's A1 notation for rows, columns and sheet names; the edge between people and indices. */
public final class A1 {
  private A1() {}

  /** Letters of a zero-based column: 0 is A, 26 is AA. */
  public static String column(int column) {
    StringBuilder letters = new StringBuilder(3);
    for (int rest = column + 1; rest > 0; rest = (rest - 1) / 26) {
      letters.append((char) ('A' + (rest - 1) % 26));
    }
    return letters.reverse().toString();
  }

  /** Zero-based column of letters such as {@code AA}. */
  public static int column(String letters) {
    int column = 0;
    for (int i = 0; i < letters.length(); i++) {
      column = column * 26 + (Character.toUpperCase(letters.charAt(i)) - 'A' + 1);
    }
    return column - 1;
  }

  /** {@code D5} of zero-based indices. */
  public static String cell(int row, int column) {
    return column(column) + (row + 1);
  }

  /** The sheet's name, quoted where Excel quotes it. */
  public static String sheet(String name) {
    return needsQuotes(name) ? "'" + name.replace("'", "''") + "'" : name;
  }

  private static boolean needsQuotes(String name) {
    if (name.isEmpty() || !(Character.isLetter(name.charAt(0)) || name.charAt(0) == '_')) {
      return true;
    }
    boolean plain =
        name.chars().allMatch(c -> Character.isLetterOrDigit(c) || c == '_' || c == '.');
    return !plain
        || name.matches("(?i)[a-z]{1,3}[0-9]{1,7}")
        || name.matches("(?i)r?[0-9]*c?[0-9]*|true|false");
  }
}
