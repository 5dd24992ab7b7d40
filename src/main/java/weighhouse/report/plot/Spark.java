package weighhouse.report.plot;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.report.text.Numbers;

/** The effective ratio along the cycles as a small line beside the entered one. */
public final class Spark {
  private static final int WIDTH = 160;
  private static final int HEIGHT = 44;
  private static final int MOST_POINTS = 160;

  private Spark() {}

  /** Draws the line; nothing for fewer than two numbers. */
  public static void draw(Element parent, List<Double> series, double entered) {
    double[] numbers =
        series.stream().mapToDouble(Double::doubleValue).filter(Double::isFinite).toArray();
    if (numbers.length < 2) {
      return;
    }
    double least = Math.min(entered, java.util.Arrays.stream(numbers).min().orElse(entered));
    double most = Math.max(entered, java.util.Arrays.stream(numbers).max().orElse(entered));
    double room = Math.max((most - least) * 0.08, Math.abs(entered) * 0.002 + 1e-12);
    Axis y = new Axis(least - room, most + room, HEIGHT - 4, 4, false);
    Axis x = new Axis(0, numbers.length - 1, 2, WIDTH - 2, false);
    Svg svg =
        Svg.drawing(parent, "spark", WIDTH, HEIGHT, "Effective ratio by cycle", words(numbers));
    svg.line("entered-line", 2, y.at(entered), WIDTH - 2, y.at(entered));
    svg.path("series s1", path(numbers, x, y));
  }

  private static String words(double[] numbers) {
    return "From "
        + Numbers.show(numbers[0])
        + " in the first to "
        + Numbers.show(numbers[numbers.length - 1])
        + " in the last of "
        + numbers.length
        + " cycles";
  }

  private static String path(double[] numbers, Axis x, Axis y) {
    StringBuilder path = new StringBuilder();
    int stride = Math.max(1, numbers.length / MOST_POINTS);
    for (int i = 0; i < numbers.length; i += stride) {
      path.append(i == 0 ? 'M' : 'L')
          .append(Svg.number(x.at(i)))
          .append(' ')
          .append(Svg.number(y.at(numbers[i])));
    }
    return path.toString();
  }
}
