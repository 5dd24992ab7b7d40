package weighhouse.workbook;

/**
 * A defined name.
 *
 * @param name as written in the workbook
 * @param scope zero-based sheet it belongs to, or {@link #WORKBOOK_SCOPE}
 * @param formula what it stands for, without the leading equals sign
 * @param hidden whether it is hidden from the user
 * @param comment the author's note on it, may be empty
 */
public record DefinedName(String name, int scope, String formula, boolean hidden, String comment) {
  /** The scope of names that every sheet sees. */
  public static final int WORKBOOK_SCOPE = -1;
}
