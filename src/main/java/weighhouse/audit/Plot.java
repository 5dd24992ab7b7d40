package weighhouse.audit;

import java.util.List;

/**
 * Data for a plot in the report.
 *
 * @param about id of the finding or A1 address it belongs to, or {@link #DRAWS}
 * @param title for people
 * @param x label of the horizontal axis
 * @param y label of the vertical axis
 * @param series the lines
 */
public record Plot(String about, String title, String x, String y, List<Series> series) {
  /** What a plot of the probabilistic draws is about. */
  public static final String DRAWS = "draws";

  /** A line; xs and ys have the same length, NaN leaves a gap. */
  public record Series(String name, List<Double> xs, List<Double> ys) {}
}
