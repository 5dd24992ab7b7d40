package weighhouse.formula;

/**
 * One coordinate of a reference.
 *
 * @param value the zero-based row or column when absolute, the offset from the host cell otherwise
 * @param absolute whether it carries a dollar sign
 */
public record Axis(int value, boolean absolute) {

  /**
   * The zero-based coordinate as seen from a host cell's coordinate; relative ones wrap as in
   * Excel.
   */
  public int resolve(int host) {
    return absolute ? value : host + value;
  }
}
