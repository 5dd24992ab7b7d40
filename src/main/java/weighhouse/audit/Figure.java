package weighhouse.audit;

/**
 * A number as an audit reports it, or the error that stands in its place.
 *
 * @param number the number; NaN where there is an error
 * @param error Excel's error code such as {@code #DIV/0!}, or null
 */
public record Figure(double number, String error) {
  public static Figure of(double number) {
    return new Figure(number, null);
  }
}
